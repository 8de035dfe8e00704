import { residualNote } from '$lib/engine/material/residual/pattern';
import type { Preferences } from '$lib/units';
import type { Bench } from '../bench.svelte';
import { figures } from '../blocks/figures';
import { lawsInUse } from '../law/laws-in-use';

/** The law that needs no word: what every figure of a code stands on. */
const usualLaw = 'elastic–plastic';

/** What bending stands on beside section and demand, in sentences: axis, law, residual stress, turns. */
export function bendText(
	{ bend, section }: Pick<Bench, 'bend' | 'section'>,
	preferences: Preferences
): string[] {
	const laws = lawsInUse(section.definition);
	return [
		...(bend.axisAngle === 0 ? [] : [axisText(bend, preferences)]),
		...(laws === usualLaw ? [] : [`Stress–strain law: ${laws}.`]),
		...residualText(bend),
		...turnsText(bend, preferences)
	];
}

function axisText({ axisAngle, transverse }: Bench['bend'], preferences: Preferences): string {
	const axis = `Bent about the axis at ${figures(preferences).ratio(axisAngle)}° from y`;
	return transverse === 'curvature-zero' ? `${axis}, the section held about it.` : `${axis}.`;
}

function residualText({ residual, start, fault }: Bench['bend']): string[] {
	if (fault) return [`Residual stress and turns are not followed. ${fault.message}`];
	const note = residualNote(residual);
	if (residual === 'none' || start === null) return [];
	return [`With ${residual} residual stress.${note ? ` ${note.message}` : ''}`];
}

function turnsText({ turned, turns }: Bench['bend'], preferences: Preferences): string[] {
	if (!turned || turns.length === 0) return [];
	const show = figures(preferences);
	const legs = turned.legs.map(({ turn, to, moment }) =>
		turn === 'release'
			? `let go, staying at ${show.ratio(to)} κy`
			: `to ${show.ratio(to)} κy (${show.moment(moment, true)})`
	);
	const lost = turned.lost === null ? '' : ` Turn ${turned.lost} could not be reached.`;
	return [`Bent before: ${legs.join('; ')}.${lost}`];
}
