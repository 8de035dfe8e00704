/**
 * Share of a flange–web junction in the torsion constant: α D⁴, D the circle inscribed where a
 * flange, a web and root radii r meet. Sizes mm, results mm⁴.
 */

/** Diameter of the circle inscribed in a T junction with root radii, mm. */
export const teeCircle = (tw: number, tf: number, r: number): number =>
	((r + tf) ** 2 + tw * (r + tw / 4)) / (2 * r + tf);

/**
 * El Darwish & Johnston, Torsion of structural shapes, ASCE Journal of the Structural Division 91
 * (1965), T junction with parallel flange. A junction never takes away: α is not below 0.
 */
export function elDarwishJohnstonTee(tw: number, tf: number, r: number): number {
	const [web, root] = [tw / tf, r / tf];
	const alpha = -0.042 + 0.2204 * web + 0.1355 * root - 0.0865 * root * web - 0.0725 * web ** 2;
	return Math.max(alpha, 0) * teeCircle(tw, tf, r) ** 4;
}

/** Formula printed with the continental IPE and HE tables: α = (tw/tf)(0.145 + 0.1 r/tf). */
export const continentalTee = (tw: number, tf: number, r: number): number =>
	(tw / tf) * (0.145 + (0.1 * r) / tf) * teeCircle(tw, tf, r) ** 4;

/** El Darwish & Johnston (1965), L junction of a channel's flange with its web. */
export function elDarwishJohnstonCorner(tw: number, tf: number, r: number): number {
	const [web, root] = [tw / tf, r / tf];
	const alpha = -0.0908 + 0.2621 * web + 0.1231 * root - 0.0752 * root * web - 0.0945 * web ** 2;
	const circle = 2 * (3 * r + tw + tf - Math.sqrt(2 * (2 * r + tw) * (2 * r + tf)));
	return Math.max(alpha, 0) * circle ** 4;
}

/** El Darwish & Johnston (1965), L junction of two legs of one thickness. */
export function elDarwishJohnstonAngle(t: number, r: number): number {
	const circle = 2 * (3 * r + 2 * t - Math.SQRT2 * (2 * r + t));
	return (0.0768 + (0.0479 * r) / t) * circle ** 4;
}
