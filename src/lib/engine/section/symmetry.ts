import type { Part, PreparedSection } from './prepared';

/** Whether both halves of a section are the same steel. */
export interface Symmetry {
	readonly leftRight: boolean;
	readonly topBottom: boolean;
}

/**
 * Symmetry of a section in shape and strength, by its kind. Free plates and outlines count as without:
 * a moment about one axis then has to be balanced, which is right for them too when they have it.
 */
export function sectionSymmetry({ definition, parts }: PreparedSection): Symmetry {
	const same = (a: string, b: string) => sameSteel(parts, a, b);
	switch (definition.kind) {
		case 'i': {
			const { b, tf, bBottom = b, tfBottom = tf } = definition;
			const level = b === bBottom && tf === tfBottom && same('topFlange', 'bottomFlange');
			return { leftRight: true, topBottom: level };
		}
		case 'box': {
			const { b, tfTop, bBottom = b, tfBottom } = definition;
			const level = b === bBottom && tfTop === tfBottom && same('topFlange', 'bottomFlange');
			return { leftRight: same('leftWeb', 'rightWeb'), topBottom: level };
		}
		case 'rectangular-hollow':
			return {
				leftRight: same('leftWeb', 'rightWeb'),
				topBottom: same('topFlange', 'bottomFlange')
			};
		case 'channel':
			return { leftRight: false, topBottom: same('topFlange', 'bottomFlange') };
		case 'tee':
			return { leftRight: true, topBottom: false };
		case 'circular-hollow':
		case 'flat':
		case 'round':
			return { leftRight: true, topBottom: true };
		case 'angle':
		case 'plates':
		case 'outline':
			return { leftRight: false, topBottom: false };
	}
}

function sameSteel(parts: readonly Part[], a: string, b: string): boolean {
	const one = parts.find(({ name }) => name === a)?.material;
	const other = parts.find(({ name }) => name === b)?.material;
	return one === other || (one?.fy === other?.fy && one?.fyc === other?.fyc);
}
