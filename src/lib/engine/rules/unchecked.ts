const uncheckedWords: Readonly<Record<string, string>> = {
	'ltb-not-checked': 'lateral–torsional buckling',
	'member-buckling-not-checked': 'member buckling',
	'shear-buckling-not-built': 'shear buckling',
	'shear-not-checked': 'shear buckling',
	'm-v-not-built': 'bending with high shear',
	'flange-induced-buckling-not-checked': 'flange-induced buckling',
	'net-section-not-checked': 'net section at bolt holes',
	'tension-flange-holes-not-built': 'bolt holes in bending',
	'resistance-missing': 'bolt holes in tension',
	'class-4-not-built': 'effective widths',
	'class-not-built': 'class and resistance',
	'code-not-built': 'class and resistance'
};

/** What the notes of these codes leave unchecked, in words, each once. */
export const uncheckedNames = (codes: readonly string[]): string[] => [
	...new Set(codes.flatMap((code) => uncheckedWords[code] ?? []))
];
