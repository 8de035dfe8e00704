import type { RequestEvent } from '@sveltejs/kit';
import type { Result } from '../../../engine/result';
import { shapeDefinition } from '../../queries/shapes';
import { enforceComputeRate } from '../../rate-limit/compute-rate';
import { answer } from '../answer';
import { jsonBody } from '../body';
import { handled } from '../handled';
import { refused, type Refusal } from '../refusal';
import type { FindShape } from './subject';

type Compute = (
	body: unknown,
	findShape: FindShape,
	signal?: AbortSignal,
	query?: URLSearchParams
) => Promise<Result<unknown, Refusal>>;

/** A stateless compute route: rate, body, figures, answer. */
export const computeRoute = (compute: Compute) => (event: RequestEvent) =>
	handled(event, async () => {
		const limited = await enforceComputeRate(event);
		if (limited) return limited;
		const body = await jsonBody(event.request);
		if (!body.ok) return refused(body.error);
		const result = await compute(
			body.value,
			shapeDefinition,
			event.request.signal,
			event.url.searchParams
		);
		return result.ok ? answer(result.value) : refused(result.error);
	});
