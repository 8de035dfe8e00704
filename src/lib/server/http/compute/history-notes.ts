import type { ResponseRequest } from '../../../api/response';
import { residualNote } from '../../../engine/material/residual/pattern';
import type { History } from '../../../engine/response/history/history';
import type { Note } from '../../../engine/result';

const oneWayNote: Note = {
	code: 'strained-one-way',
	message:
		'Between two reversals each fibre is taken to be strained one way only, so that its stress follows from its strain at both ends. That is exact as long as the neutral axis does not sweep back over steel that has yielded; where N is large or the axis turns much, ask for more reversals in between.'
};

const kinematicNote: Note = {
	code: 'kinematic-hardening',
	message:
		'A law that hardens is unloaded with kinematic hardening (parallel elastic–plastic layers, Masing): the elastic range stays fy + fyc, and on reversal the curve is followed at twice its size. Hardening that widens the elastic range is not counted.'
};

const noRatioNote: Note = {
	code: 'no-curvature-ratio',
	message:
		'Residual stress is at the yield strength before any load: first yield has no curvature to count in, and states by curvatureRatio are not given. Ask by curvature or moment.'
};

const asksForRatio = ({ at, unloadFrom }: ResponseRequest): boolean =>
	at?.curvatureRatio !== undefined || unloadFrom?.curvatureRatio !== undefined;

/** What a figure under residual stress or after unloading rests on. */
export const historyNotes = (
	request: ResponseRequest,
	history: History,
	firstCurvature: number | null
): Note[] => {
	const residual = residualNote(history.residual);
	const turns = request.unloadFrom !== undefined || request.cycle !== undefined;
	const hardens = history.layers.some((layers) => layers.length > 1);
	return [
		...(residual ? [residual] : []),
		...(turns ? [oneWayNote] : []),
		...(turns && hardens ? [kinematicNote] : []),
		...(firstCurvature === 0 && asksForRatio(request) ? [noRatioNote] : [])
	];
};
