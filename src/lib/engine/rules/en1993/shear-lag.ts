import type { Note } from '../../result';
import { boxSizes } from '../../section/kinds/box';
import { iSizes } from '../../section/kinds/i';
import type { EnModel } from './model';

/**
 * Flanges count as wide where 50 b0 is more than this many depths: spans shorter than 15 depths are
 * uncommon for a girder (common practice, no source).
 */
const shortSpan = 15;

/**
 * Shear lag of wide flanges, EN 1993-1-5 3.1: negligible where b0 < Le/50, b0 an outstand or half an internal
 * width. No span is known here, so the note gives the length Le above which it may be neglected. Welded
 * I, box and free plates; rolled sections of normal width have none.
 */
export function shearLagNotes({ section, elements }: EnModel): Note[] {
	const { definition, gross } = section;
	let b0 = 0;
	if (definition.kind === 'i' && definition.fabrication === 'welded') {
		const { bTop, bBottom, tw } = iSizes(definition);
		b0 = (Math.max(bTop, bBottom) - tw) / 2;
	} else if (definition.kind === 'box') {
		const { bTop, bBottom, tw, webGap } = boxSizes(definition);
		b0 = Math.max(webGap / 2, (Math.max(bTop, bBottom) - webGap) / 2 - tw);
	} else if (definition.kind === 'plates' && elements.kind === 'plates') {
		for (const { type, c, from, to } of elements.plates)
			if (Math.abs(to.y - from.y) > Math.abs(to.z - from.z))
				b0 = Math.max(b0, type === 'outstand' ? c : c / 2);
	}
	if (50 * b0 <= shortSpan * gross.height) return [];
	return [
		{
			code: 'shear-lag',
			message: `Shear lag of the flanges is not counted: it may be neglected where the length between points of zero moment is over 50 b0 = ${((50 * b0) / 1000).toFixed(1)} m. The span is not known here.`,
			clause: 'EN 1993-1-5 3.1(1)'
		}
	];
}
