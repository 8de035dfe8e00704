import { contractVersion, engineVersion } from '$lib/engine/version';
import { answer } from '$lib/server/http/answer';
import { noShape } from '$lib/server/http/compute/subject';
import { handled, onlyMethods } from '$lib/server/http/handled';
import { refused } from '$lib/server/http/refusal';
import { shapeById } from '$lib/server/queries/shapes';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = (event) =>
	handled(event, async () => {
		const { id } = event.params;
		const shape = await shapeById(id);
		return shape
			? answer({ contract: contractVersion, engineVersion, ...shape })
			: refused(noShape(id));
	});
export const fallback = onlyMethods('GET');
