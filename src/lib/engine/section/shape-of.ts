import { fail } from '../result';
import type { SectionDefinition } from './definition';
import { angleShape } from './kinds/angle';
import { flatShape, roundShape } from './kinds/bars';
import { boxShape } from './kinds/box';
import { channelShape } from './kinds/channel';
import { circularHollowShape } from './kinds/circular-hollow';
import { iShape } from './kinds/i';
import { outlineShape } from './kinds/outline';
import { platesShape } from './kinds/plates';
import { rectangularHollowShape } from './kinds/rectangular-hollow';
import { teeShape } from './kinds/tee';
import type { ShapeResult } from './shape';

/** Geometry of a definition of any kind, or everything that is wrong with it. */
export function shapeOf(definition: SectionDefinition): ShapeResult {
	switch (definition.kind) {
		case 'i':
			return iShape(definition);
		case 'channel':
			return channelShape(definition);
		case 'tee':
			return teeShape(definition);
		case 'angle':
			return angleShape(definition);
		case 'rectangular-hollow':
			return rectangularHollowShape(definition);
		case 'circular-hollow':
			return circularHollowShape(definition);
		case 'box':
			return boxShape(definition);
		case 'flat':
			return flatShape(definition);
		case 'round':
			return roundShape(definition);
		case 'plates':
			return platesShape(definition);
		case 'outline':
			return outlineShape(definition);
		default:
			return unknownKind(definition);
	}
}

function unknownKind(definition: never): ShapeResult {
	const { kind } = definition as { kind?: unknown };
	return fail([{ path: 'kind', message: `Section kind ${String(kind)} is not known.` }]);
}
