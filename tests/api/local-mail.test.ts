import { afterAll, beforeAll, expect, it } from 'vitest';
import { startInstance, type Instance } from '../setup/instance';
import { newcomer, owner, visitor } from './visitor';

let instance: Instance;

beforeAll(async () => {
	instance = await startInstance();
});

afterAll(() => instance.stop());

const eventually = async (holds: () => boolean | Promise<boolean>): Promise<boolean> => {
	for (let tries = 0; tries < 60; tries += 1) {
		if (await holds()) return true;
		await new Promise((resolve) => setTimeout(resolve, 50));
	}
	return false;
};

it('without a mail server, mail to an invented address is read at /dev/mail', async () => {
	const { person, browser } = await owner(instance.url);
	await browser.form('/forgot', { email: person.email });
	const mailbox = visitor('', instance.url);
	const arrived = async () => (await mailbox.page('/dev/mail')).text.includes(person.email);
	expect(await eventually(arrived)).toBe(true);
	expect((await mailbox.page('/dev/mail')).text).toContain(`${instance.url}/reset?token=`);
});

it('in production, mail to an address that may be real is refused and the log says what to set', async () => {
	const person = { ...newcomer(), email: `${crypto.randomUUID()}@steelwork-office.org` };
	const browser = visitor('', instance.url);
	await browser.form('/sign-up', person);
	await browser.form('/forgot', { email: person.email });
	expect(await eventually(() => instance.log().includes('Set SMTP_URL'))).toBe(true);
	const mailbox = await visitor('', instance.url).page('/dev/mail');
	expect(mailbox.status).toBe(200);
	expect(mailbox.text).not.toContain(person.email);
	expect(instance.log()).not.toContain(person.email);
});
