import { describe, expect, it } from 'vitest';
import { prepareSection } from '$lib/engine/section/prepare';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { issueSchema } from './error';

const grade = 'S355';

/** Issues of a section as they go over the wire. */
function sent(definition: SectionDefinition) {
	const built = prepareSection(definition);
	if (built.ok) throw new Error('The section stands.');
	return built.error.map((issue) => issueSchema.parse(JSON.parse(JSON.stringify(issue))));
}

describe('issues over the API', () => {
	it('carry the mend of plates that lie apart', () => {
		const plate = { width: 100, thickness: 10, y: 0, angle: 0 };
		const plates = [
			{ ...plate, name: 'lower', z: 0 },
			{ ...plate, name: 'upper', z: 14 }
		];
		expect(sent({ kind: 'plates', grade, plates })[0]?.mend).toMatchObject({
			path: 'plates.1',
			changes: [{ plate: 'upper', y: 0, z: 10 }]
		});
	});

	it('tell where a ring crosses itself', () => {
		const outer = [
			[0, 0],
			[100, 100],
			[100, 0],
			[0, 100]
		] as const;
		expect(sent({ kind: 'outline', grade, outer })[0]?.at).toEqual({ y: 50, z: 50 });
	});
});
