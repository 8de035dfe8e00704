import { formatNumber, formatQuantity, type Preferences } from '$lib/units';

/** Figures as they stand on the drawing: short, in the person's units. */
export const figures = (preferences: Preferences) => ({
	length: (mm: number) =>
		formatQuantity(mm, 'length', preferences, {
			digits: preferences.system === 'us' ? 4 : 5,
			trim: true
		}),
	level: (mm: number) =>
		formatQuantity(mm, 'length', preferences, {
			decimals: preferences.system === 'us' ? 2 : 1
		}),
	strain: (strain: number) =>
		formatQuantity(strain, 'strain', preferences, { decimals: 2, plus: true, unit: true }),
	stress: (stress: number) =>
		formatQuantity(stress, 'stress', preferences, {
			decimals: preferences.system === 'us' ? 1 : 0,
			plus: true
		}),
	force: (kN: number) => formatQuantity(kN, 'force', preferences, { digits: 4, unit: true }),
	moment: (kNm: number, unit = false) =>
		formatQuantity(kNm, 'moment', preferences, { digits: 4, unit }),
	ratio: (ratio: number) => formatNumber(ratio, preferences, { digits: 3, trim: true })
});

export type Figures = ReturnType<typeof figures>;
