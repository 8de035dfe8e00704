import { arrangementOf } from '../../geometry/arrangement';
import { cornersOf } from '../../geometry/plate-contact';
import { mergedLoops } from '../../geometry/trace';
import type { PlatesSection } from '../definition';
import { contactOf, type Contact } from './contacts';
import { closedCells, filletsOf } from './fillets';
import type { WeldedContact } from './holds';
import { placedPlates, type PlacedPlates } from './placing';
import { isEndToEnd } from './runs';
import { stripOf, type Strip } from './strips';

/** Contacts that join plates, and those that do not count as joints. */
export interface Joints {
	readonly strips: readonly Strip[];
	readonly welded: readonly WeldedContact[];
	/** In contact, but not among the joins that are given. */
	readonly loose: readonly Contact[];
	/** Touching at a point only, or end to end with little of the ends on each other. */
	readonly doubtful: readonly Contact[];
}

/**
 * Joints of checked plates. Without `joins` every contact along a line is a weld of leg 0. A contact
 * at a point is one only where a join says so.
 */
export function jointsOf(definition: PlatesSection): Joints {
	const { plates, joins } = definition;
	const placed = placedPlates(plates);
	const strips = plates.map(stripOf);
	const contacts = placed.touching.map(({ a, b }) => contactOf(strips, a, b, placed.tolerance));
	const legs = joins && legsByPair(definition);
	const legOf = ({ a, b }: Contact) => legs?.get(pairOf(plates[a]!.name, plates[b]!.name));
	const known = (contact: Contact) => legOf(contact) !== undefined;
	const clear = (contact: Contact) => isClear(strips, contact);
	const joined = contacts.filter((one) => (joins ? known(one) : clear(one)));
	const cells = joins?.some(({ weldLeg = 0 }) => weldLeg > 0) ? cellsOf(placed) : [];
	return {
		strips,
		welded: joined.map((contact) => ({
			...contact,
			leg: legOf(contact) ?? 0,
			...filletsOf(strips, contact, cells)
		})),
		loose: joins ? contacts.filter((one) => !known(one)) : [],
		doubtful: joins
			? joined.filter((one) => one.length > 0 && !clear(one))
			: contacts.filter((one) => !clear(one))
	};
}

const isClear = (strips: readonly Strip[], contact: Contact): boolean =>
	contact.length > 0 &&
	(contact.onA.edge !== 'end' || contact.onB.edge !== 'end' || isEndToEnd(strips, contact));

const pairOf = (a: string, b: string): string => JSON.stringify(a < b ? [a, b] : [b, a]);

/** The leg of every join, the least where a pair is named twice. */
function legsByPair({ joins = [] }: PlatesSection): Map<string, number> {
	const legs = new Map<string, number>();
	for (const { a, b, weldLeg = 0 } of joins)
		legs.set(pairOf(a, b), Math.min(legs.get(pairOf(a, b)) ?? Infinity, weldLeg));
	return legs;
}

function cellsOf({ boxes, tolerance }: PlacedPlates) {
	const rings = boxes.map((box, owner) => ({ points: cornersOf(box), owner }));
	return closedCells(mergedLoops(arrangementOf(rings, tolerance)));
}
