import type { ISection } from '../section/definition';
import type { PlateStock } from './plate-stock';
import { around, thicker, variable, type Variable } from './variable';

/** Flange thickness leaves the web as it is: the depth grows with it. */
export function iVariables(definition: ISection, stock: PlateStock): Variable[] {
	const { b, tf, tw, h, bBottom = b, tfBottom = tf } = definition;
	const web = [
		variable<ISection>('web', 'tw', tw, thicker(stock, tw), (d, to) => ({ ...d, tw: to })),
		variable<ISection>('web', 'h', h, around(h, stock.depthStep), (d, to) => ({ ...d, h: to }))
	];
	if (bBottom === b && tfBottom === tf)
		return [
			...web,
			variable<ISection>('flanges', 'b', b, around(b, stock.widthStep), (d, to) => ({
				...d,
				b: to,
				...(d.bBottom === undefined ? {} : { bBottom: to })
			})),
			variable<ISection>('flanges', 'tf', tf, thicker(stock, tf), (d, to) => ({
				...d,
				h: d.h + 2 * (to - d.tf),
				tf: to,
				...(d.tfBottom === undefined ? {} : { tfBottom: to })
			}))
		];
	return [
		...web,
		variable<ISection>('topFlange', 'b', b, around(b, stock.widthStep), (d, to) => ({
			...d,
			b: to,
			bBottom: d.bBottom ?? d.b
		})),
		variable<ISection>('topFlange', 'tf', tf, thicker(stock, tf), (d, to) => ({
			...d,
			h: d.h + to - d.tf,
			tf: to,
			tfBottom: d.tfBottom ?? d.tf
		})),
		variable<ISection>(
			'bottomFlange',
			'bBottom',
			bBottom,
			around(bBottom, stock.widthStep),
			(d, to) => ({
				...d,
				bBottom: to
			})
		),
		variable<ISection>('bottomFlange', 'tfBottom', tfBottom, thicker(stock, tfBottom), (d, to) => ({
			...d,
			h: d.h + to - (d.tfBottom ?? d.tf),
			tfBottom: to
		}))
	];
}
