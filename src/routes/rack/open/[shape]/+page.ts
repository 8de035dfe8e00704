import { error, redirect } from '@sveltejs/kit';
import { sectionSchema } from '$lib/api/section';
import { z } from '$lib/api/zod';
import { benchPath } from '$lib/components/bench/opened-study';
import { openingBend, openingStudy } from '$lib/components/bench/study';
import type { PageLoad } from './$types';

const shape = z.looseObject({ designation: z.string(), definition: sectionSchema });

/** Opens a catalogue shape on the Bench, in the usual grade of its standard and without demand. */
export const load: PageLoad = async ({ params, fetch }) => {
	const response = await fetch(`/api/v1/shapes/${encodeURIComponent(params.shape)}`);
	if (!response.ok) error(404, 'No catalogue has this shape. Search the Rack for it.');
	const { designation, definition } = shape.parse(await response.json());
	const demands = [{ name: 'Case 1' }];
	const study = { ...openingStudy, shape: designation, section: definition, demands };
	redirect(307, benchPath({ study, bend: openingBend }));
};
