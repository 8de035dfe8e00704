import { oneOf, strict, within } from './fields';
import { ranges } from './ranges';

/** Transverse stiffeners of the web. */
export const stiffenersSchema = strict('stiffeners', {
	spacing: within('Spacing of stiffeners', 'mm', ranges.spacing),
	endPost: oneOf('endPost', ['rigid', 'non-rigid'])
}).meta({ id: 'Stiffeners', description: 'Transverse stiffeners of the web.' });
