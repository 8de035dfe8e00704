import type { BoxSection } from '../section/definition';
import type { PlateStock } from './plate-stock';
import { around, thicker, variable, type Variable } from './variable';

/** The flanges follow the webs when these move: their outstands stay as they are. */
export function boxVariables(definition: BoxSection, stock: PlateStock): Variable[] {
	const { h, tw, tfTop, tfBottom, webGap } = definition;
	const wider = (d: BoxSection, by: number): BoxSection => ({
		...d,
		b: d.b + by,
		...(d.bBottom === undefined ? {} : { bBottom: d.bBottom + by })
	});
	return [
		variable<BoxSection>('webs', 'tw', tw, thicker(stock, tw), (d, to) => ({
			...wider(d, 2 * (to - d.tw)),
			tw: to
		})),
		variable<BoxSection>('webs', 'h', h, around(h, stock.depthStep), (d, to) => ({ ...d, h: to })),
		variable<BoxSection>('webs', 'webGap', webGap, around(webGap, stock.widthStep), (d, to) => ({
			...wider(d, to - d.webGap),
			webGap: to
		})),
		variable<BoxSection>('topFlange', 'tfTop', tfTop, thicker(stock, tfTop), (d, to) => ({
			...d,
			h: d.h + to - d.tfTop,
			tfTop: to
		})),
		variable<BoxSection>(
			'bottomFlange',
			'tfBottom',
			tfBottom,
			thicker(stock, tfBottom),
			(d, to) => ({
				...d,
				h: d.h + to - d.tfBottom,
				tfBottom: to
			})
		)
	];
}
