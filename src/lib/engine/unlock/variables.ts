import type { TeeSection } from '../section/definition';
import { boxVariables } from './box-variables';
import { iVariables } from './i-variables';
import type { PlateStock } from './plate-stock';
import { platesVariables } from './plates-variables';
import type { Girder } from './proposal';
import { around, thicker, variable, type Variable } from './variable';

/** Spacings of stiffeners are tried down to this share of the web's depth. */
const closest = 0.5;
const spacingsTried = 12;

/** What may be changed of a section, in stock steps; empty for shapes that come as they are. */
export function variablesOf({ definition, stiffeners }: Girder, stock: PlateStock): Variable[] {
	switch (definition.kind) {
		case 'i':
			return definition.fabrication === 'welded'
				? [...iVariables(definition, stock), ...spacing(definition.h, stiffeners, stock)]
				: [];
		case 'box':
			return [...boxVariables(definition, stock), ...spacing(definition.h, stiffeners, stock)];
		case 'tee':
			return definition.fabrication === 'welded' ? teeVariables(definition, stock) : [];
		case 'flat':
			return [
				variable<typeof definition>(
					'bar',
					'b',
					definition.b,
					thicker(stock, definition.b),
					(d, b) => ({
						...d,
						b
					})
				)
			];
		case 'plates':
			return platesVariables(definition, stock);
		case 'channel':
		case 'angle':
		case 'rectangular-hollow':
		case 'circular-hollow':
		case 'round':
		case 'outline':
			return [];
		default:
			return definition satisfies never;
	}
}

function teeVariables({ h, b, tw, tf }: TeeSection, stock: PlateStock): Variable[] {
	return [
		variable<TeeSection>('web', 'tw', tw, thicker(stock, tw), (d, to) => ({ ...d, tw: to })),
		variable<TeeSection>('web', 'h', h, around(h, stock.widthStep), (d, to) => ({ ...d, h: to })),
		variable<TeeSection>('flange', 'b', b, around(b, stock.widthStep), (d, to) => ({
			...d,
			b: to
		})),
		variable<TeeSection>('flange', 'tf', tf, thicker(stock, tf), (d, to) => ({
			...d,
			h: d.h + to - d.tf,
			tf: to
		}))
	];
}

/** Stiffeners closer together, or put in where there are none: spacings below the present one. */
function spacing(depth: number, stiffeners: Girder['stiffeners'], stock: PlateStock): Variable[] {
	const { stiffenerStep: step } = stock;
	const from = stiffeners?.spacing ?? 0;
	const longest = from > 0 ? from : 3 * depth;
	const steps: number[] = [];
	for (let at = Math.floor(longest / step) * step; at >= closest * depth; at -= step)
		if (at > 0 && at !== from) steps.push(at);
	const changed = (girder: Girder, to: number): Girder => ({
		...girder,
		stiffeners: { endPost: girder.stiffeners?.endPost ?? 'non-rigid', spacing: to }
	});
	const tried = steps.slice(0, spacingsTried);
	return tried.length === 0
		? []
		: [{ part: 'stiffeners', field: 'spacing', value: from, runs: [tried], changed }];
}
