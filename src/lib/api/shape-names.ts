/**
 * Writing of a designation without its accidents: lower case, × as x, comma as point, no blanks,
 * numbers without idle zeros. `HSS 20.000X0.500` and `hss20x.5` become the same.
 */
export const foldedName = (text: string) =>
	text
		.toLowerCase()
		.replaceAll(/[×*]/g, 'x')
		.replaceAll(',', '.')
		.replaceAll(/\s+/g, '')
		.replaceAll(/(?<![\d.])\.(?=\d)/g, '0.')
		.replaceAll(/(\d+)\.(\d*?)0*(?!\d)/g, (_, whole: string, rest: string) =>
			rest ? `${whole}.${rest}` : whole
		);

const wideFlange = /^HE (\d+) ([A-Z]+)$/;
const lightBeam = /^IPE A (\d+)$/;
const lettersFirst = /^([A-Z]+(?: [A-Z]+)*) ([\d.x×/-]+)$/;

/**
 * Other names by which the trade knows a shape: `HE 300 A` is `HEA 300`,
 * `UB 457x191x67` is `457x191x67 UB`.
 */
export const shapeAliases = (designation: string): string[] => {
	const wide = wideFlange.exec(designation);
	if (wide) return [`HE${wide[2]} ${wide[1]}`];
	const light = lightBeam.exec(designation);
	if (light) return [`IPEA ${light[1]}`, `IPE ${light[1]} A`];
	const first = lettersFirst.exec(designation);
	return first ? [`${first[2]} ${first[1]}`] : [];
};
