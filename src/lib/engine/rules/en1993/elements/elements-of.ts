import type { Note } from '../../../result';
import type { PreparedSection } from '../../../section/prepared';
import { outlineNotClassed } from '../../not-built';
import { plateStretches } from '../../../section/plates/stretches';
import { epsilonOf, type Strengths } from '../strengths';
import { angleElements, angleWhole } from './angle';
import { isStockyFlat } from './bars';
import { boxElements } from './box';
import { channelElements } from './channel';
import type { Flat, SectionElements } from './element';
import { stretchElements } from './free-plates';
import { iElements } from './i';
import { hollowElements } from './rectangular-hollow';
import { teeElements } from './tee';

/** What is classified, or null with the reason why there is no class. */
export interface FoundElements {
	readonly elements: SectionElements | null;
	readonly notes: readonly Note[];
}

/** The parts of a section that Table 5.2 (2022: Table 7.3) classifies. */
export function elementsOf({ definition }: PreparedSection, strengths: Strengths): FoundElements {
	const epsilon = epsilonOf(strengths.most, strengths.modulus);
	const own = { fy: strengths.most, epsilon };
	switch (definition.kind) {
		case 'i':
			return measured(iElements(definition), strengths);
		case 'box':
			return measured(boxElements(definition), strengths);
		case 'rectangular-hollow':
			return measured(hollowElements(definition), strengths);
		case 'channel':
			return measured(channelElements(definition), strengths);
		case 'tee':
			return measured(teeElements(definition), strengths);
		case 'angle': {
			const plates = flatElements(angleElements(definition), strengths);
			return found({ kind: 'plates', plates, angle: { ...angleWhole(definition), ...own } });
		}
		case 'circular-hollow': {
			const { d: c, t } = definition;
			const centre = { y: c / 2, z: c / 2 };
			return found({ kind: 'tube', tube: { part: 'wall', type: 'tubular', c, t, centre, ...own } });
		}
		case 'round':
			return found({ kind: 'solid', part: 'bar' });
		case 'flat':
			return isStockyFlat(definition, epsilon)
				? found({ kind: 'solid', part: 'bar' })
				: { elements: null, notes: [slenderFlat] };
		case 'plates': {
			const { stretches, notes } = plateStretches(definition);
			if (stretches === null) return { elements: null, notes };
			if (stretches.length === 0) return { elements: null, notes: [...notes, nothingClear] };
			const plates = stretchElements(stretches, strengths);
			return { elements: { kind: 'plates', plates, angle: null }, notes };
		}
		case 'outline':
			return { elements: null, notes: [outlineNotClassed] };
	}
}

const slenderFlat: Note = {
	code: 'flat-too-slender',
	message:
		'A flat bar wider than 18ε times its thickness has no class: Table 5.2 has no row for a plate with two free edges, and only a stockier bar is sure not to twist out of its plane. There is no resistance but to tension. First yield and full plastic are properties of the section only.',
	clause: 'EN 1993-1-1 Table 5.2'
};

const nothingClear: Note = {
	code: 'no-clear-plate',
	message:
		'No plate has a clear width between its supports, so there is nothing to classify and no resistance is given. First yield and full plastic are properties of the section only.',
	clause: 'EN 1993-1-1 Table 5.2'
};

const found = (elements: SectionElements): FoundElements => ({ elements, notes: [] });

const measured = (flats: readonly Flat[], strengths: Strengths): FoundElements =>
	found({ kind: 'plates', plates: flatElements(flats, strengths), angle: null });

const webs = new Set(['web', 'leftWeb', 'rightWeb']);

/** A web follows the strain of its flanges: its ε is that of the strongest part (EN 1993-1-5, 4.3(6)). */
function flatElements(flats: readonly Flat[], { of, most, modulus }: Strengths) {
	return flats.map(({ id, part, type, t, from, to }) => {
		const [dy, dz] = [to.y - from.y, to.z - from.z];
		const c = Math.sqrt(dy * dy + dz * dz);
		const fy = webs.has(part) ? most : of(part);
		return { id, part, type, c, t, fy, epsilon: epsilonOf(fy, modulus), from, to };
	});
}
