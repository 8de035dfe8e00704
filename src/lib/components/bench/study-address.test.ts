import { describe, expect, it } from 'vitest';
import { benchPath, openedStudy, openingAddressed } from './opened-study';
import { openingBend, openingStudy, type Study } from './study';
import { addressedStudy, addressText } from './study-address';

const studied: Study = {
	...openingStudy,
	shape: 'IPE 300',
	section: {
		kind: 'i',
		h: 300,
		b: 150,
		tw: 7.1,
		tf: 10.7,
		r: 15,
		fabrication: 'rolled',
		grade: 'S275'
	},
	strengthBasis: 'code-table',
	demands: [
		{ name: 'Wind', My: 40, N: -120.5 },
		{ name: 'Snow · Süd', Mz: 3 }
	]
};
const bend = { ...openingBend, axisAngle: 90, ratio: -1.25, activeCase: 1 };

const encoded = (value: unknown) =>
	'1.' + btoa(JSON.stringify(value)).replaceAll('+', '-').replaceAll('/', '_').replace(/=+$/, '');

describe('a study in the address', () => {
	it('comes back as it went', () => {
		const back = addressedStudy(addressText({ study: studied, bend }));
		expect(back).toEqual({ ok: true, value: { study: studied, bend } });
	});

	it('carries stiffeners, member lengths and every code choice', () => {
		const study: Study = {
			...studied,
			code: {
				...studied.code,
				standard: 'EN1993-1-1:2022',
				classAlpha: 'proportional',
				useStressLevel: true,
				ltbCurves: 'rolled-or-equivalent'
			},
			demands: [{ name: 'Wind', My: 40, unbracedLength: 4000, C1: 1.13, zg: 150 }],
			stiffeners: { spacing: 1500, endPost: 'rigid' }
		};
		const back = addressedStudy(addressText({ study, bend: openingBend }));
		expect(back).toEqual({ ok: true, value: { study, bend: openingBend } });
	});

	it('carries residual stress, turns, where it stands and a typed N', () => {
		const past = { ...openingBend, turns: [3, 'release', -2] as const, atTurn: true, typedN: -50 };
		const study: Study = { ...studied, residual: 'welded' };
		const back = addressedStudy(addressText({ study, bend: past }));
		expect(back).toEqual({ ok: true, value: { study, bend: past } });
	});

	it('is safe in an address and stays short', () => {
		const text = addressText({ study: studied, bend });
		expect(text).toMatch(/^1\.[A-Za-z0-9_-]+$/);
		expect(text.length).toBeLessThan(500);
	});

	it('leaves the address plain for the girder that the Bench opens with', () => {
		expect(benchPath(openingAddressed)).toBe('/bench');
		expect(benchPath({ study: studied, bend })).toMatch(/^\/bench\?study=1\./);
	});

	it.each([
		['is damaged', '1.%%%'],
		['is not JSON', '1.aGVsbG8'],
		['lacks a section', encoded({ d: [{ name: 'A' }] })],
		['has no demand case', encoded({ s: openingStudy.section, d: [] })],
		['has a size that is not a number', encoded({ s: { ...openingStudy.section, h: 'x' }, d: [] })],
		['comes from a later version', addressText({ study: studied, bend }).replace('1.', '7.')]
	])('that %s opens the plate girder and says so', (_, text) => {
		const opened = openedStudy(new URLSearchParams({ study: text }));
		expect(opened.addressed).toEqual(openingAddressed);
		expect(opened.notice).toMatch(
			/^The (study|section) in this link .*\. A plate girder is opened/
		);
	});

	it('that cannot be built says which size is wrong', () => {
		const section = { ...openingStudy.section, tw: -3 };
		const opened = openedStudy(
			new URLSearchParams({ study: encoded({ s: section, d: [{ name: 'A' }] }) })
		);
		expect(opened.notice).toMatch(/cannot be built/);
	});
});
