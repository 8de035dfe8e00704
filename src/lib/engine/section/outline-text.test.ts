import { describe, expect, it } from 'vitest';
import { outlineFromText } from './outline-text';
import { prepareSection } from './prepare';

const regions = (text: string) => {
	const read = outlineFromText(text);
	if (!read.ok) throw new Error(read.error.map(({ message }) => message).join(' '));
	return read.value.regions;
};
const messages = (text: string): string[] => {
	const read = outlineFromText(text);
	return read.ok ? [] : read.error.map(({ message }) => message);
};
const triangle = [
	[0, 0],
	[10.5, 0],
	[0, 20.25]
];
const square = (from: number, to: number) =>
	`${from} ${from}\n${to} ${from}\n${to} ${to}\n${from} ${to}\n`;

describe('pasted coordinates', () => {
	it('may be parted by blanks, tabs, commas or semicolons, with a decimal point or comma', () => {
		for (const text of [
			'0 0\n10.5 0\n0 20.25',
			'0\t0\r\n10,5\t0\r\n0\t20,25\r\n',
			'0,0\n10.5,0\n0,20.25',
			'0, 0\n10.5, 0\n0 , 20.25',
			'0;0\n10,5;0\n0; 20,25',
			'0;0;\n1.05e1;0;\n+0;2025e-2;',
			'\uFEFFy;z\n0;0\n10.5;-0\n0;20.25'
		])
			expect(regions(text)[0]!.outer.map(([y, z]) => [y + 0, z + 0])).toEqual(triangle);
	});

	it('may be negative, with a hyphen or a minus sign', () => {
		expect(regions('-1 -2\n\u22123 4\n5 \u22126')[0]!.outer).toEqual([
			[-1, -2],
			[-3, 4],
			[5, -6]
		]);
	});

	it('pass over headings and say so with their line numbers', () => {
		const read = outlineFromText('Corner list\ny [mm], z [mm]\n\n0 0\n1 0\n0 1\n');
		expect(read.ok && read.value.headings.map(({ line }) => line)).toEqual([1, 2]);
		expect(read.ok && read.value.headings[1]!.message).toBe(
			'Line 2 is passed over as a heading: “y [mm], z [mm]”.'
		);
	});

	it('make a ring within another its hole, whichever comes first', () => {
		for (const text of [
			`${square(0, 100)}\n${square(20, 60)}`,
			`${square(20, 60)}\n\n${square(0, 100)}`
		]) {
			const found = regions(text);
			expect(found).toHaveLength(1);
			const prepared = prepareSection({ kind: 'outline', grade: 355, regions: found });
			expect(prepared.ok && prepared.value.gross.area).toBeCloseTo(8400, 9);
		}
	});

	it('make rings beside each other regions, and a ring within a hole a region', () => {
		const beside = regions('0 0\n1 0\n1 1\n0 1\n\n1 0\n2 0\n2 1\n1 1');
		expect(beside.map(({ holes }) => holes)).toEqual([undefined, undefined]);
		const nested = regions(
			`${square(0, 100)}\n${square(10, 90)}\n${square(20, 80)}\n${square(30, 70)}`
		);
		expect(nested.map(({ outer, holes }) => [outer[0], holes!.length])).toEqual([
			[[0, 0], 1],
			[[20, 20], 1]
		]);
	});

	it('take a hole that touches the outer ring for a hole', () => {
		expect(regions(`${square(0, 100)}\n0 50\n50 25\n50 75`)[0]!.holes).toHaveLength(1);
	});
});

describe('pasted coordinates that cannot be read', () => {
	it('are told with every line number', () => {
		expect(messages('y z\n0 0\n1 x\n1 1 1\n0 1\n2 2\nend')).toEqual([
			'Line 3 is not two numbers, y and z: “1 x”.',
			'Line 4 is not two numbers, y and z: “1 1 1”.',
			'Line 7 is not two numbers, y and z: “end”.'
		]);
		expect(messages('1,5,2,5\n0,0\n1,1\n0,1')).toEqual([
			'Line 1 is not two numbers, y and z: “1,5,2,5”.'
		]);
	});

	it('are not enough for a ring, or none', () => {
		expect(messages('0 0\n1 0\n0 1\n\n5 5\n6 6\n5 5')).toEqual([
			'The ring that begins on line 5 needs at least 3 different points, not 2.'
		]);
		expect(messages('')).toEqual(['There are no coordinates in the text.']);
		expect(messages('y z\n')).toEqual(['There are no coordinates in the text.']);
	});

	it('are numbers beyond all bounds', () => {
		expect(messages('1e999 0\n1 0\n0 1')[0]).toContain('Line 1 is not two numbers');
	});
});
