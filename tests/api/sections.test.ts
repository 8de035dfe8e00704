import { beforeAll, describe, expect, inject, it } from 'vitest';
import demo from '../../src/lib/server/seed/demo-accounts.json';
import { newcomer, owner, signedIn, visitor, type Section, type Visitor } from './visitor';

const girder = {
	kind: 'i',
	fabrication: 'welded',
	h: 940,
	b: 400,
	tw: 14,
	tf: 20,
	weldLeg: 8,
	grade: 'S355'
};
const path = '/api/v1/sections';

let named = 0;
const newName = (start = 'Girder') => `${start} ${Date.now().toString(36)} ${(named += 1)}`;

const save = async (browser: Visitor, more: Record<string, unknown> = {}): Promise<Section> => {
	const request = { name: newName(), definition: girder, ...more };
	const { status, body } = await browser.json('POST', path, request);
	if (status !== 201 || !body.section) throw new Error(`${status} ${JSON.stringify(body)}`);
	return body.section;
};

let browser: Visitor;
beforeAll(async () => {
	browser = (await owner()).browser;
});

describe('a section', () => {
	it('is saved as a draft with figures and hash of the server’s own', async () => {
		const section = await save(browser, { area: 1, inputHash: 'mine', status: 'approved' });
		expect(section).toMatchObject({ version: 1, status: 'draft', h: 940, b: 400 });
		// Closed form: 2·400·20 + 900·14 mm², at 7850 kg/m³.
		expect(section.area).toBeCloseTo(28_600, 6);
		expect(section.mass).toBeCloseTo(224.51, 6);
		expect(section.inputHash).toMatch(/^[0-9a-f]{64}$/);
	});

	it('is listed and read as it was saved', async () => {
		const settings = { code: { standard: 'EN1993-1-1:2005' }, demands: [{ name: 'A', My: 2400 }] };
		const saved = await save(browser, { settings, project: 'Mallow Dock' });
		const list = await browser.json('GET', `${path}?q=${encodeURIComponent(saved.name)}`);
		expect(list.body.items?.map(({ id }) => id)).toEqual([saved.id]);
		expect(list.body).toMatchObject({ contract: 1, total: 1, page: 1 });
		const read = await browser.json('GET', `${path}/${saved.id}`);
		expect(read.body.section).toMatchObject({ definition: girder, settings });
	});

	it('that cannot be is refused with the place of the fault', async () => {
		const wrong = { name: newName(), definition: { ...girder, tw: 0 } };
		const { status, body } = await browser.json('POST', path, wrong);
		expect(status).toBe(400);
		expect(body.error?.code).toBe('invalid_section');
		expect(body.error?.issues?.[0]?.path).toBe('definition.tw');
	});

	it('without a name is refused', async () => {
		const { status, body } = await browser.json('POST', path, { name: ' ', definition: girder });
		expect(status).toBe(400);
		expect(body.error?.message).toBe('Give the section a name.');
	});

	it('under a name that the Rack has already is refused, capitals and spaces aside', async () => {
		const first = await save(browser);
		const again = { name: ` ${first.name.toUpperCase()}`, definition: girder };
		const { status, body } = await browser.json('POST', path, again);
		expect([status, body.error?.code]).toEqual([409, 'name_taken']);
	});

	it('is renamed, and each save is a version', async () => {
		const saved = await save(browser);
		const name = newName('Renamed');
		const changed = await browser.json('PATCH', `${path}/${saved.id}`, { version: 1, name });
		expect(changed.body.section).toMatchObject({ name, version: 2, definition: girder });
		expect(changed.body.section?.inputHash).toBe(saved.inputHash);
	});

	it('takes new dimensions, its figures and hash with them', async () => {
		const saved = await save(browser);
		const definition = { ...girder, tw: 16 };
		const { body } = await browser.json('PATCH', `${path}/${saved.id}`, { version: 1, definition });
		expect(body.section?.area).toBeCloseTo(2 * 400 * 20 + 900 * 16, 6);
		expect(body.section?.inputHash).not.toBe(saved.inputHash);
	});

	it('is a draft again once its steel changes after approval', async () => {
		const saved = await save(browser);
		const url = `${path}/${saved.id}`;
		const approved = await browser.json('PATCH', url, { version: 1, status: 'approved' });
		expect(approved.body.section?.status).toBe('approved');
		const definition = { ...girder, tw: 12 };
		const changed = await browser.json('PATCH', url, { version: 2, definition });
		expect(changed.body.section?.status).toBe('draft');
	});

	it('is deleted, brought back by undo, and its name is free in between', async () => {
		const saved = await save(browser);
		const url = `${path}/${saved.id}`;
		expect((await browser.json('DELETE', url)).status).toBe(200);
		expect((await browser.json('GET', url)).status).toBe(404);
		expect((await browser.json('DELETE', url)).status).toBe(404);
		expect((await browser.json('PATCH', url, { version: 1, name: 'X' })).status).toBe(404);
		expect((await browser.json('POST', `${url}/restore`)).status).toBe(200);
		expect((await browser.json('GET', url)).body.section).toMatchObject({
			id: saved.id,
			version: 1
		});
		await browser.json('DELETE', url);
		await save(browser, { name: saved.name });
		const late = await browser.json('POST', `${url}/restore`);
		expect([late.status, late.body.error?.code]).toEqual([409, 'name_taken']);
	});
});

describe('two people saving the same section', () => {
	it('the later one gets 409 with both, and nothing is overwritten', async () => {
		const saved = await save(browser);
		const url = `${path}/${saved.id}`;
		await browser.json('PATCH', url, { version: 1, definition: { ...girder, tw: 15 } });
		const mine = { version: 1, definition: { ...girder, tw: 18 } };
		const late = await browser.json('PATCH', url, mine);
		expect([late.status, late.body.error?.code]).toEqual([409, 'moved_on']);
		expect(late.body.yours).toMatchObject(mine);
		expect(late.body.theirs).toMatchObject({ version: 2, definition: { tw: 15 } });
		const now = await browser.json('GET', url);
		expect(now.body.section?.definition).toMatchObject({ tw: 15 });
	});

	it('at the very same moment, one of them wins', async () => {
		const saved = await save(browser);
		const url = `${path}/${saved.id}`;
		const both = await Promise.all(
			[15, 16, 17, 18].map((tw) =>
				browser.json('PATCH', url, { version: 1, definition: { ...girder, tw } })
			)
		);
		expect(both.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
		expect((await browser.json('GET', url)).body.section?.version).toBe(2);
	});
});

describe('the list', () => {
	it('is sorted, paged and searched within the firm', async () => {
		const { browser: other } = await owner();
		for (const [name, tw] of [
			['B beam', 10],
			['A beam', 20],
			['C_post', 30]
		] as const)
			await save(other, { name, definition: { ...girder, tw } });
		const names = async (query: string) =>
			(await other.json('GET', `${path}?${query}`)).body.items?.map(({ name }) => name);
		expect(await names('sort=name')).toEqual(['A beam', 'B beam', 'C_post']);
		expect(await names('sort=-mass')).toEqual(['C_post', 'A beam', 'B beam']);
		expect(await names('sort=name&pageSize=1&page=2')).toEqual(['B beam']);
		expect(await names('q=beam&sort=name')).toEqual(['A beam', 'B beam']);
		expect(await names('q=_')).toEqual(['C_post']);
		expect(await names('q=%25')).toEqual([]);
		expect((await other.json('GET', `${path}?sort=colour`)).status).toBe(400);
		expect((await other.json('GET', `${path}?pageSize=0`)).status).toBe(400);
	});
});

const routesOn = (id: string) =>
	[
		['GET', `${path}/${id}`, undefined],
		['PATCH', `${path}/${id}`, { version: 1, name: 'Taken over' }],
		['DELETE', `${path}/${id}`, undefined],
		['POST', `${path}/${id}/restore`, undefined]
	] as const;

describe('strangers', () => {
	it('who are not signed in get 401 from every route', async () => {
		const saved = await save(browser);
		for (const [method, url, body] of routesOn(saved.id))
			expect((await visitor().json(method, url, body)).status).toBe(401);
		expect((await visitor().json('GET', path)).status).toBe(401);
		const create = { name: newName(), definition: girder };
		expect((await visitor().json('POST', path, create)).status).toBe(401);
	});

	it('of another firm get 404 from every route, as for a section that never was', async () => {
		const saved = await save(browser);
		const { browser: stranger } = await owner();
		const never = newcomer().name.replaceAll(' ', '-');
		for (const [at, [method, url, body]] of routesOn(saved.id).entries()) {
			const theirs = await stranger.json(method, url, body);
			const nothing = await stranger.json(method, routesOn(never)[at]?.[1] ?? '', body);
			expect(theirs.status).toBe(404);
			expect(theirs.body).toEqual(nothing.body);
		}
		const list = await stranger.json('GET', path);
		expect(list.body.items).toEqual([]);
		expect((await browser.json('GET', `${path}/${saved.id}`)).status).toBe(200);
	});

	it('on another site cannot write with somebody’s cookies', async () => {
		const saved = await save(browser);
		const address = `${inject('baseUrl')}${path}/${saved.id}`;
		const headers = { cookie: browser.cookies(), origin: 'https://elsewhere.example' };
		expect((await fetch(address, { method: 'DELETE', headers })).status).toBe(403);
	});
});

/** What each role is answered, written out by hand: create, then on a draft, then on an approved one. */
const matrix = {
	owner: { create: 201, draft: [200, 200, 200, 200], approved: [200, 200, 200, 200], approve: 200 },
	librarian: {
		create: 201,
		draft: [200, 200, 200, 200],
		approved: [200, 200, 200, 200],
		approve: 200
	},
	designer: {
		create: 201,
		draft: [200, 200, 200, 200],
		approved: [200, 403, 403, 403],
		approve: 403
	},
	checker: {
		create: 403,
		draft: [200, 403, 403, 403],
		approved: [200, 403, 403, 403],
		approve: 403
	},
	reader: { create: 403, draft: [200, 403, 403, 403], approved: [200, 403, 403, 403], approve: 403 }
} as const;

describe.each(demo.people.map(({ role, email }) => [role, email] as const))(
	'a %s of the demo firm',
	(role, email) => {
		const expected = matrix[role as keyof typeof matrix];
		let me: Visitor;
		let keeper: Visitor;
		beforeAll(async () => {
			me = await signedIn(email, demo.password);
			const librarian = demo.people.find((person) => person.role === 'librarian');
			keeper = await signedIn(librarian?.email ?? '', demo.password);
		});

		const answersOn = async (id: string, version: number) => {
			const statuses: number[] = [];
			for (const [method, url, body] of routesOn(id)) {
				const sent = body ? { ...body, version, name: newName() } : body;
				statuses.push((await me.json(method, url, sent)).status);
			}
			return statuses;
		};

		it('sees the list', async () => {
			expect((await me.json('GET', path)).status).toBe(200);
		});

		it('may save or not, as the table of rights says', async () => {
			const { status } = await me.json('POST', path, { name: newName(), definition: girder });
			expect(status).toBe(expected.create);
		});

		it('may read, change, delete and restore a draft or not', async () => {
			const saved = await save(keeper);
			expect(await answersOn(saved.id, 1)).toEqual(expected.draft);
		});

		it('may read, change, delete and restore an approved one or not', async () => {
			const saved = await save(keeper);
			await keeper.json('PATCH', `${path}/${saved.id}`, { version: 1, status: 'approved' });
			expect(await answersOn(saved.id, 2)).toEqual(expected.approved);
		});

		it('may approve or not', async () => {
			const saved = await save(keeper);
			const approval = { version: 1, status: 'approved' };
			const { status } = await me.json('PATCH', `${path}/${saved.id}`, approval);
			expect(status).toBe(expected.approve);
		});
	}
);

describe('the Rack page', () => {
	it('shows a visitor the catalogues and how to get in', async () => {
		const { text } = await visitor().page('/rack');
		expect(text).toContain('IPE 80');
		expect(text).toContain('/sign-in?next=/rack');
	});

	it('lists the demo firm’s sections without any script, marked as invented', async () => {
		const reader = demo.people.find(({ role }) => role === 'reader');
		const { text } = await (
			await signedIn(reader?.email ?? '', demo.password)
		).page('/rack?q=Transfer');
		expect(text).toContain('Transfer girder G2');
		expect(text).toContain('Invented for the demo.');
	});

	it('searches the catalogues by address', async () => {
		const { text } = await visitor().page('/rack?in=catalogues&q=ub+457');
		expect(text).toContain('UB 457x191x67');
		expect(text).not.toContain('IPE 80');
	});

	it('opens a catalogue shape on the Bench, and says so when there is none', async () => {
		const open = (id: string) =>
			fetch(`${inject('baseUrl')}/rack/open/${id}`, { redirect: 'manual' });
		const known = await open('en10365-ipe-300');
		expect(known.status).toBe(307);
		const bench = await visitor().page(known.headers.get('location') ?? '');
		expect(bench.text).toContain('IPE 300');
		expect((await open('no-such-shape')).status).toBe(404);
	});
});
