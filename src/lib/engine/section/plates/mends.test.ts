import { describe, expect, it } from 'vitest';
import type { Issue } from '../../result';
import type { Plate, PlatesSection } from '../definition';
import { prepareSection } from '../prepare';
import { mendedPlates } from './mends';

const plate = (
	name: string,
	width: number,
	thickness: number,
	y: number,
	z: number,
	angle = 0
): Plate => ({ name, width, thickness, y, z, angle });
const section = (...plates: Plate[]): PlatesSection => ({ kind: 'plates', grade: 355, plates });

const top = plate('top', 300, 20, 0, 410);
const web = plate('web', 800, 10, 0, 0, 90);
const bottom = plate('bottom', 300, 20, 0, -410);

function issues(definition: PlatesSection): Issue[] {
	const result = prepareSection(definition);
	return result.ok ? [] : result.error;
}
/** The section after the mends that its issues offer, one after another. */
function mended(definition: PlatesSection): PlatesSection {
	const mend = issues(definition)[0]?.mend;
	return mend ? mended(mendedPlates(definition, mend)) : definition;
}

describe('a mend of plates', () => {
	it('moves an overlapping plate out, and not the one that others stand on', () => {
		const [issue] = issues(section({ ...top, z: 407 }, web, bottom));
		expect(issue!.mend).toEqual({
			words: 'Move “top” by 3 mm up so that it touches “web”.',
			path: 'plates.0',
			changes: [{ plate: 'top', y: 0, z: 410 }]
		});
	});

	it('closes a gap by moving the smaller of the pieces', () => {
		const [issue] = issues(section({ ...top, z: 412 }, web, bottom));
		expect(issue!.mend!.changes).toEqual([{ plate: 'top', y: 0, z: 410 }]);
		expect(issue!.mend!.words).toBe('Move “top” by 2 mm down so that it touches “web”.');
	});

	it('brings a floating piece to the nearest plate, slantwise when it must', () => {
		const floating = section(top, web, bottom, plate('far', 40, 10, 180 + 3, 425 + 4));
		// right end of top 150, upper face 420; the corner of “far” at (163, 424): 13 to the left, 4 down
		const [issue] = issues(floating);
		expect(issue!.message).toContain('the gap is 13.6015 mm');
		expect(issue!.mend!.words).toBe(
			'Move “far” by 13 mm to the left and 4 mm down so that it touches “top”.'
		);
	});

	it('solves every issue it is offered for, at any turn', () => {
		const turned = (one: Plate, turn: number): Plate => {
			const [c, s] = [Math.cos((turn * Math.PI) / 180), Math.sin((turn * Math.PI) / 180)];
			const [y, z] = [one.y * c - one.z * s, one.y * s + one.z * c];
			return { ...one, y, z, angle: one.angle + turn };
		};
		for (const turn of [0, 17, 45, 90, 211]) {
			for (const off of [-9, -3, 0.5, 40]) {
				const wrong = [{ ...top, z: 410 + off }, web, { ...bottom, z: -405 }];
				const all = section(...wrong.map((one) => turned(one, turn)));
				expect(issues(all).every(({ mend }) => mend)).toBe(true);
				expect(issues(mended(all))).toEqual([]);
			}
		}
	});

	it('brings several floating pieces home one by one', () => {
		const scattered = section(
			top,
			{ ...web, z: -30 },
			{ ...bottom, z: -500 },
			plate('far', 40, 10, 400, 600)
		);
		expect(issues(scattered)).toHaveLength(1);
		expect(issues(mended(scattered))).toEqual([]);
	});

	it('never deepens another overlap', () => {
		// the web is 10 too long for the frame: moved up or down it would only go deeper on one side
		const frame = section(
			plate('top', 300, 20, 0, 405),
			plate('bottom', 300, 20, 0, -405),
			plate('left', 790, 10, -100, 0, 90),
			plate('right', 790, 10, 100, 0, 90),
			web
		);
		const moved = issues(frame).flatMap(({ mend }) => mend!.changes.map((one) => one.plate));
		expect(moved).toEqual(['top', 'bottom']);
	});
});
