const uncheckedWords: Readonly<Record<string, string>> = {
	'ltb-not-checked': 'lateral–torsional buckling',
	'member-buckling-not-checked': 'member buckling',
	'shear-buckling-not-built': 'shear buckling',
	'shear-not-checked': 'shear buckling',
	'web-shear-not-built': 'moment beside shear buckling',
	'flange-induced-not-built': 'flange-induced buckling',
	'net-section-not-checked': 'net section at bolt holes',
	'resistance-missing': 'bolt holes',
	'shear-lag': 'shear lag',
	'class-4-not-built': 'class 4 of this shape',
	'class-not-built': 'class and resistance',
	'code-not-built': 'class and resistance'
};

/** What the notes of these codes leave unchecked, in words, each once. */
export const uncheckedNames = (codes: readonly string[]): string[] => [
	...new Set(codes.flatMap((code) => uncheckedWords[code] ?? []))
];
