import { describe, expect, inject, it } from 'vitest';
import type { CaughtMail } from '../setup/mail';
import { behindItsBack } from './database';
import { newcomer, owner, signedIn, visitor } from './visitor';

const rackOf = (browser: { json: ReturnType<typeof visitor>['json'] }) =>
	browser.json('GET', '/api/v1/sections');

const mailsTo = async (address: string): Promise<CaughtMail[]> => {
	const all = (await (await fetch(inject('mailboxUrl'))).json()) as CaughtMail[];
	return all.filter(({ to }) => to.includes(address));
};

const firstOf = async <T>(look: () => Promise<T | undefined>): Promise<T> => {
	for (let tries = 0; tries < 60; tries += 1) {
		const found = await look();
		if (found !== undefined) return found;
		await new Promise((resolve) => setTimeout(resolve, 50));
	}
	throw new Error('It did not come.');
};

/** Path of the link in a mail, its quoted-printable text undone. */
const linkIn = ({ raw }: CaughtMail): string => {
	const text = raw.replaceAll(/=\r?\n/g, '').replaceAll('=3D', '=');
	const link = /https?:\/\/\S+\/reset\?token=[\w-]+/.exec(text)?.[0] ?? '';
	return new URL(link).pathname + new URL(link).search;
};

describe('signing up', () => {
	it('makes a firm whose owner is signed in at once', async () => {
		const { person, browser } = await owner();
		const rack = await browser.page('/rack?in=ours');
		expect(rack.text).toContain(person.firm);
		expect((await rackOf(browser)).body.total).toBe(0);
	});

	it('refuses an address that has an account, in other capitals too', async () => {
		const { person } = await owner();
		const again = { ...newcomer(), email: person.email.toUpperCase() };
		const answer = await visitor().form('/sign-up', again);
		expect(answer.status).toBe(409);
		expect(await answer.text()).toContain('has an account already');
	});

	it.each([
		['a short password', { password: 'short' }, 'at least 10'],
		['a wrong address', { email: 'nobody' }, 'not an e-mail address'],
		['no firm', { firm: '  ' }, 'Name the firm']
	])('refuses %s and says why', async (_, wrong, sentence) => {
		const answer = await visitor().form('/sign-up', { ...newcomer(), ...wrong });
		expect(answer.status).toBe(400);
		expect(await answer.text()).toContain(sentence);
	});

	it('never gives a password back to the page', async () => {
		const person = { ...newcomer(), email: 'nobody', password: 'a telling password' };
		const answer = await visitor().form('/sign-up', person);
		expect(await answer.text()).not.toContain('a telling password');
	});
});

describe('signing in', () => {
	it('answers an unknown address as it answers a wrong password', async () => {
		const { person } = await owner();
		const wrong = await visitor().form('/sign-in?/password', {
			email: person.email,
			password: 'not the one'
		});
		const unknown = await visitor().form('/sign-in?/password', {
			email: newcomer().email,
			password: 'not the one'
		});
		expect([wrong.status, unknown.status]).toEqual([400, 400]);
		const sentence = 'E-mail and password do not belong together.';
		expect(await wrong.text()).toContain(sentence);
		expect(await unknown.text()).toContain(sentence);
	});

	it('stops somebody who guesses, and lets others in', async () => {
		const { person } = await owner();
		const guess = () =>
			visitor().form('/sign-in?/password', { email: person.email, password: 'a guess' });
		const statuses: number[] = [];
		for (let tries = 0; tries < 11; tries += 1) statuses.push((await guess()).status);
		expect(statuses.slice(0, 10)).toEqual(Array(10).fill(400));
		expect(statuses[10]).toBe(429);
		expect((await owner()).browser.cookies()).toContain('session-token');
	});

	it('goes on to the page that was wanted, and never to another site', async () => {
		const { person } = await owner();
		const to = async (next: string) => {
			const { email, password } = person;
			const answer = await visitor().form('/sign-in?/password', { email, password, next });
			return new URL(answer.headers.get('location') ?? '', inject('baseUrl')).href;
		};
		expect(await to('/bench?study=1')).toBe(`${inject('baseUrl')}/bench?study=1`);
		expect(await to('https://elsewhere.example/')).toBe(`${inject('baseUrl')}/rack`);
		expect(await to('//elsewhere.example/')).toBe(`${inject('baseUrl')}/rack`);
	});

	it('is not taken from a page of another site', async () => {
		const answer = await fetch(`${inject('baseUrl')}/sign-in?/password`, {
			method: 'POST',
			headers: { origin: 'https://elsewhere.example' },
			body: new URLSearchParams({ email: 'a@b.example', password: 'x' })
		});
		expect(answer.status).toBe(403);
	});
});

describe('signing out', () => {
	it('ends a copied session too', async () => {
		const { browser } = await owner();
		const copied = visitor(browser.cookies());
		expect((await rackOf(copied)).status).toBe(200);
		expect((await browser.form('/sign-out', {})).status).toBe(303);
		expect((await rackOf(browser)).status).toBe(401);
		expect((await rackOf(visitor(copied.cookies()))).status).toBe(401);
	});

	it('with a dead cookie ends nobody else’s session', async () => {
		const { person, browser } = await owner();
		const stolen = browser.cookies();
		await browser.form('/sign-out', {});
		const again = await signedIn(person.email, person.password);
		await visitor(stolen).form('/sign-out', {});
		await visitor(stolen).form('/auth/signout', {});
		expect((await rackOf(again)).status).toBe(200);
	});
});

describe('a session', () => {
	it('follows a changed role at the next request', async () => {
		const { person, browser } = await owner();
		expect((await browser.page('/rack?in=ours')).text).toContain('New section');
		await behindItsBack(
			`UPDATE memberships SET role = 'reader' WHERE user_id = (SELECT id FROM users WHERE email = ?)`,
			[person.email]
		);
		expect((await browser.page('/rack?in=ours')).text).not.toContain('New section');
	});

	it('is dead once the person is switched off', async () => {
		const { person, browser } = await owner();
		await behindItsBack('UPDATE users SET active = 0 WHERE email = ?', [person.email]);
		expect((await rackOf(browser)).status).toBe(401);
		const { email, password } = person;
		const answer = await visitor().form('/sign-in?/password', { email, password });
		expect(answer.status).toBe(400);
	});

	it('cannot be made up', async () => {
		const forged = visitor('authjs.session-token=eyJhbGciOiJkaXIifQ..x.y.z');
		expect((await rackOf(forged)).status).toBe(401);
	});
});

describe('somebody in two firms', () => {
	it('works in the one taken in hand, and cannot take one that is not theirs', async () => {
		const [mine, other, strange] = [await owner(), await owner(), await owner()];
		const member = `INSERT INTO memberships (id, firm_id, user_id, role, created_at)
			SELECT uuid(), m.firm_id, me.id, 'reader', utc_timestamp(3)
			FROM users me JOIN users them JOIN memberships m ON m.user_id = them.id
			WHERE me.email = ? AND them.email = ?`;
		await behindItsBack(member, [mine.person.email, other.person.email]);
		const firmIdIn = (html: string, name: string) =>
			new RegExp(`<option value="([\\w-]+)"[^>]*>${name}`).exec(html)?.[1] ?? '';
		const { text } = await mine.browser.page('/rack?in=ours');
		expect(text).toContain(mine.person.firm);
		await mine.browser.form('/switch-firm', { firm: firmIdIn(text, other.person.firm) });
		const there = (await mine.browser.page('/rack?in=ours')).text;
		expect(there).toContain(`${other.person.firm}.`);
		expect(there).not.toContain('New section');
		const stranger = (await strange.browser.page('/rack?in=ours')).text;
		expect(stranger).not.toContain('Switch firm');
		await mine.browser.form('/switch-firm', { firm: 'not-mine' });
		expect((await rackOf(mine.browser)).status).toBe(200);
	});
});

describe('a forgotten password', () => {
	it('is set anew by a mailed link that works once, and ends every session', async () => {
		const { person, browser } = await owner();
		await visitor().form('/forgot', { email: person.email });
		const path = linkIn(await firstOf(async () => (await mailsTo(person.email))[0]));
		const token = path.split('token=')[1] ?? '';
		const set = (password: string) =>
			visitor().form('/reset', { token, password, again: password });
		expect((await visitor().page(path)).text).toContain('Set the password');
		expect((await set('an altogether new one')).status).toBe(303);
		expect((await set('and once more, stolen')).status).toBe(400);
		expect((await visitor().page(path)).text).toContain('no longer works');
		expect((await rackOf(browser)).status).toBe(401);
		await expect(signedIn(person.email, person.password)).rejects.toThrow();
		await signedIn(person.email, 'an altogether new one');
	});

	it('uses up older links with the newest', async () => {
		const { person } = await owner();
		for (let asked = 1; asked <= 2; asked += 1) {
			await visitor().form('/forgot', { email: person.email });
			await firstOf(async () => (await mailsTo(person.email))[asked - 1]);
		}
		const tokens = (await mailsTo(person.email)).map(
			(mail) => linkIn(mail).split('token=')[1] ?? ''
		);
		const set = (token: string | undefined) =>
			visitor().form('/reset', {
				token: token ?? '',
				password: 'the second password',
				again: 'the second password'
			});
		expect((await set(tokens[1])).status).toBe(303);
		expect((await set(tokens[0])).status).toBe(400);
	});

	it('says the same for an address that nobody has, and mails nothing', async () => {
		const { email } = newcomer();
		const answer = await visitor().form('/forgot', { email });
		expect(answer.status).toBe(200);
		expect(await answer.text()).toContain('a link is on its way');
		await new Promise((resolve) => setTimeout(resolve, 300));
		expect(await mailsTo(email)).toEqual([]);
	});

	it('leads to this site whatever host the request claims', async () => {
		const { person } = await owner();
		await fetch(`${inject('baseUrl')}/forgot`, {
			method: 'POST',
			headers: {
				origin: inject('baseUrl'),
				accept: 'text/html',
				'x-forwarded-host': 'elsewhere.example'
			},
			body: new URLSearchParams({ email: person.email })
		});
		const mail = await firstOf(async () => (await mailsTo(person.email))[0]);
		expect(mail.raw).toContain(inject('baseUrl'));
		expect(mail.raw).not.toContain('elsewhere');
	});

	it('after an hour the link is dead', async () => {
		const { person } = await owner();
		await visitor().form('/forgot', { email: person.email });
		const path = linkIn(await firstOf(async () => (await mailsTo(person.email))[0]));
		await behindItsBack(
			`UPDATE password_resets SET expires_at = utc_timestamp(3) - interval 1 second
			WHERE user_id = (SELECT id FROM users WHERE email = ?)`,
			[person.email]
		);
		expect((await visitor().page(path)).text).toContain('no longer works');
	});
});

describe('the local mailbox', () => {
	it('does not exist where a mail server is set up', async () => {
		expect((await visitor().page('/dev/mail')).status).toBe(404);
	});
});
