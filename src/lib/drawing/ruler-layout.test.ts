import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rulerLayout } from './ruler-layout';
import { roughTextWidth } from './text-width';

const marks = (...values: number[]) =>
	values.map((value, index) => ({ key: `${index}`, value, label: `a mark named ${index}` }));

describe('the ruler', () => {
	it('ends at its greatest mark', () => {
		const layout = rulerLayout(marks(2400, 3110, 3546), 600, roughTextWidth, 13);
		expect(layout.x(3546)).toBeGreaterThan(590);
		expect(layout.x(0)).toBe(0);
	});

	it('never lets labels overlap or leave it on the left', () => {
		const value = fc.double({ min: 0, max: 1000, noNaN: true });
		fc.assert(
			fc.property(fc.array(value, { minLength: 1, maxLength: 4 }), (values) => {
				const { marks: placed } = rulerLayout(marks(...values), 560, roughTextWidth, 13);
				placed.forEach((one, index) => {
					expect(one.labelX).toBeGreaterThanOrEqual(0);
					for (const other of placed.slice(index + 1)) {
						if (one.row !== other.row) continue;
						const apart =
							one.labelX + one.labelWidth <= other.labelX ||
							other.labelX + other.labelWidth <= one.labelX;
						expect(apart).toBe(true);
					}
				});
			})
		);
	});

	it('cuts no name by the line of another mark, for a demand far above all others', () => {
		for (const demand of [3600, 5000, 9000, 24000]) {
			for (const width of [300, 560, 700]) {
				const { marks: placed } = rulerLayout(marks(3110, 3546, demand), width, roughTextWidth, 13);
				const cut = placed.flatMap((label) =>
					placed.filter(
						({ key, x, row }) =>
							key !== label.key &&
							row >= label.row &&
							x > label.labelX &&
							x < label.labelX + label.labelWidth
					)
				);
				expect(cut).toEqual([]);
			}
		}
	});

	it('puts a label above the line that would run through it', () => {
		const { marks: placed } = rulerLayout(marks(3110, 3300), 600, roughTextWidth, 13);
		const [lower, upper] = ['0', '1'].map((key) => placed.find((mark) => mark.key === key));
		expect(upper?.row).toBeGreaterThan(lower?.row ?? 9);
	});
});
