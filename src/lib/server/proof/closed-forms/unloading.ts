import { bendingFrom } from '../../../engine/response/history/history-bending';
import { historyOf } from '../../../engine/response/history/history';
import { historyPicture } from '../../../engine/response/history/history-picture';
import { built } from '../examples/sections';
import { rounding, type ClosedForm } from './closed-form';

const [fy, b, h, E] = [240, 50, 120, 200_000];
const straight = { axisAngle: 0, transverse: 'moment-zero', N: 0 } as const;
const on = { topic: 'Release after bending beyond first yield', tolerance: 1e-8, why: rounding };

/** The bar bent to a multiple of the first-yield curvature and released. */
function released(ratio: number) {
	const history = historyOf(built({ kind: 'flat', b, h, grade: { fy, E } }));
	if (!history.ok) return null;
	const bend = bendingFrom(history.value, straight);
	const curvature = ratio * (bend.firstYield.curvature ?? 0);
	const loaded = bend.after({ curvature });
	return loaded && bendingFrom(loaded, straight).after({ moment: 0 });
}

/** A bar 50×120: superposed, what is left is the loaded state less M·z/I and M/EI. */
export const unloadingForms: readonly ClosedForm[] = [1.5, 2, 4].flatMap((ratio): ClosedForm[] => {
	const share = 1.5 - 0.5 / ratio ** 2;
	const at = `Bar 50×120, fy 240, released from κ/κy = ${ratio}`;
	return [
		{
			...{ ...on, id: `unloading/stress-${ratio}`, case: at, unit: 'N/mm²' },
			...{ quantity: 'residual stress at the top face', formula: 'fy·(M/My − 1)' },
			value: fy * (share - 1),
			ours: () => {
				const history = released(ratio);
				return (history && historyPicture(history).lines[0]?.points.at(-1)?.stress) ?? null;
			}
		},
		{
			...{ ...on, id: `unloading/curvature-${ratio}`, case: at, unit: '1/m' },
			...{ quantity: 'curvature left', formula: 'κ − M/EI' },
			value: (ratio - share) * (fy / E / (h / 2)) * 1e3,
			ours: () => {
				const history = released(ratio);
				return history && bendingFrom(history, straight).atMoment(0).curvature;
			}
		}
	];
});
