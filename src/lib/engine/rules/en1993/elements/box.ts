import type { BoxSection } from '../../../section/definition';
import { boxSizes } from '../../../section/kinds/box';
import { weldLegOf } from '../../../section/weld-leg';
import type { Flat } from './element';
import { outstands, type Flange } from './outstands';

/**
 * Box: the fillets stand outside, so they shorten the outstands only; flanges between the webs
 * and webs between the flanges are measured clear.
 */
export function boxElements(definition: BoxSection): Flat[] {
	const { h, bTop, bBottom, tw, tfTop, tfBottom, webGap, middle } = boxSizes(definition);
	const root = webGap / 2 + tw + weldLegOf(definition);
	const across = ({ part, t, z }: Flange): Flat => ({
		id: part,
		part,
		type: 'internal',
		t,
		from: { y: middle - webGap / 2, z },
		to: { y: middle + webGap / 2, z }
	});
	const upright = (part: string, y: number): Flat => ({
		id: part,
		part,
		type: 'internal',
		t: tw,
		from: { y, z: tfBottom },
		to: { y, z: h - tfTop }
	});
	const web = (webGap + tw) / 2;
	const top = { part: 'topFlange', t: tfTop, z: h - tfTop / 2, middle };
	const low = { part: 'bottomFlange', t: tfBottom, z: tfBottom / 2, middle };
	return [
		across(top),
		...outstands(top, root, bTop / 2),
		upright('leftWeb', middle - web),
		upright('rightWeb', middle + web),
		across(low),
		...outstands(low, root, bBottom / 2)
	];
}
