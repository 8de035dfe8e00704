import type { SourceRow } from './row';

/** Other ways in which people write the designation of a catalogue shape, without repeats. */
export function aliasesOf(row: SourceRow): string[] {
	const designation = row.designation ?? '';
	const names = [
		designation,
		...reordered(designation),
		...(row.designation_SI ? [row.designation_SI] : [])
	];
	const written = names.flatMap((name) => [name, name.replaceAll(' ', '')]);
	const all = written.flatMap((name) => [name, ...otherCrosses(name)]);
	return [...new Set(all)].filter((name) => name !== designation);
}

/** HE 300 A = HEA 300; UB 457x191x67 = 457x191x67 UB. */
function reordered(designation: string): string[] {
	const wide = /^HE (\d+) ([ABM])$/.exec(designation);
	if (wide) return [`HE${wide[2]} ${wide[1]}`];
	const light = /^IPE A (\d+)$/.exec(designation);
	if (light) return [`IPE ${light[1]} A`, `IPEA ${light[1]}`];
	const british = /^(UB|UC|PFC|RHS|SHS|CHS) (.+)$/.exec(designation);
	return british ? [`${british[2]} ${british[1]}`] : [];
}

/** The multiplication sign and the letter stand for each other between figures. */
function otherCrosses(name: string): string[] {
	const between = /(?<=\d)[xX](?=\d)/g;
	return between.test(name) ? [name.replace(between, '×'), name.replace(between, 'x')] : [];
}
