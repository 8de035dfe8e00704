import type { BoxSection, ISection } from '../../section/definition';
import { boxSizes } from '../../section/kinds/box';
import { iSizes } from '../../section/kinds/i';
import type { PreparedSection } from '../../section/prepared';
import { weldLegOf } from '../../section/weld-leg';

/** A section seen from its compression flange: flange forces, web and root fillets. mm, N. */
interface WebbedSection {
	/** Clear depth between the flanges. */
	readonly depth: number;
	/** Total thickness and strength of the webs. */
	readonly tw: number;
	readonly fw: number;
	/** Thickness of one web: its effective strips are 20 ε of it. */
	readonly single: number;
	/** Root radius or weld leg: held by the flange, effective throughout. */
	readonly edge: number;
	/** Force of the root fillets of one flange and their distance from its inner face. */
	readonly fillet: number;
	readonly filletLever: number;
	readonly compression: Flange;
	readonly tension: Flange;
}

interface Flange {
	readonly force: number;
	/** Distance of its middle from its inner face. */
	readonly half: number;
}

/**
 * Plastic moment (kNm, without γM0) of a section with a class 3 web and class 1 or 2 flanges as
 * an effective class 2 section, EN 1993-1-1:2005 6.2.2.4: of the compressed web only 20 ε tw
 * beside the compression flange and 20 ε tw beside the plastic neutral axis of the effective
 * section are kept. Null where the rule has no solution with its axis in the web.
 */
export function effectiveClassTwoMoment(
	section: PreparedSection,
	topCompressed: boolean,
	epsilon: number
): number | null {
	const webbed = webbedSection(section, topCompressed);
	return webbed === null ? null : effectiveMoment(webbed, 20 * epsilon * webbed.single);
}

function effectiveMoment(web: WebbedSection, strip: number): number | null {
	const { depth, tw, fw, edge, compression, tension } = web;
	const kept = edge + 2 * strip;
	const stretched = kept + (compression.force - tension.force) / (tw * fw);
	const axis = depth - stretched;
	if (stretched < edge || axis < kept) return null;
	const near = edge + strip;
	const webMoment = near * (axis - near / 2) + strip ** 2 / 2 + stretched ** 2 / 2;
	const flangeMoment =
		compression.force * (axis + compression.half) + tension.force * (stretched + tension.half);
	const fillets = web.fillet * (depth - 2 * web.filletLever);
	return (flangeMoment + fillets + webMoment * tw * fw) * 1e-6;
}

function webbedSection(section: PreparedSection, topCompressed: boolean): WebbedSection | null {
	const { definition } = section;
	if (definition.kind === 'i') return webbedI(section, definition, topCompressed);
	return definition.kind === 'box' ? webbedBox(section, definition, topCompressed) : null;
}

const strength = ({ parts }: PreparedSection, name: string): number => {
	const material = parts.find((part) => part.name === name)?.material;
	return material ? Math.min(material.fy, material.fyc) : 0;
};

/** Centroid of the area between a square corner and its quarter circle, from the corner, over r. */
const spandrelLever = (10 - 3 * Math.PI) / (12 - 3 * Math.PI);

function webbedI(
	section: PreparedSection,
	definition: ISection,
	topCompressed: boolean
): WebbedSection {
	const { h, bTop, tfTop, bBottom, tfBottom, tw, r } = iSizes(definition);
	const fw = strength(section, 'web');
	const top = { force: bTop * tfTop * strength(section, 'topFlange'), half: tfTop / 2 };
	const bottom = {
		force: bBottom * tfBottom * strength(section, 'bottomFlange'),
		half: tfBottom / 2
	};
	return {
		depth: h - tfTop - tfBottom,
		tw,
		fw,
		single: tw,
		edge: definition.fabrication === 'rolled' ? r : weldLegOf(definition),
		fillet: 2 * (1 - Math.PI / 4) * r ** 2 * fw,
		filletLever: spandrelLever * r,
		compression: topCompressed ? top : bottom,
		tension: topCompressed ? bottom : top
	};
}

function webbedBox(
	section: PreparedSection,
	definition: BoxSection,
	topCompressed: boolean
): WebbedSection {
	const { h, bTop, bBottom, tw, tfTop, tfBottom } = boxSizes(definition);
	const top = { force: bTop * tfTop * strength(section, 'topFlange'), half: tfTop / 2 };
	const bottom = {
		force: bBottom * tfBottom * strength(section, 'bottomFlange'),
		half: tfBottom / 2
	};
	return {
		depth: h - tfTop - tfBottom,
		tw: 2 * tw,
		fw: Math.min(strength(section, 'leftWeb'), strength(section, 'rightWeb')),
		single: tw,
		edge: 0,
		fillet: 0,
		filletLever: 0,
		compression: topCompressed ? top : bottom,
		tension: topCompressed ? bottom : top
	};
}
