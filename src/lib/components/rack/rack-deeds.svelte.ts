import {
	deleteSection,
	restoreSection,
	updateSection,
	type SectionFailure
} from '$lib/api/sections-client';
import type { SectionSummary } from '$lib/api/sections';
import { toasts } from '../ui/toasts.svelte';

const tellFailure = ({ message }: SectionFailure) => toasts.show(message, { kind: 'error' });

/** What can be done to a row of the Rack. `refresh` reads the list anew. */
export const rackDeeds = (refresh: () => Promise<void>) => {
	let busyId = $state<string | null>(null);

	const during = async <T>(id: string, work: () => Promise<T>): Promise<T> => {
		busyId = id;
		try {
			return await work();
		} finally {
			busyId = null;
		}
	};

	const bringBack = async ({ id, name }: SectionSummary) => {
		const restored = await restoreSection(id);
		if (restored.ok) toasts.show(`“${name}” is back.`);
		else tellFailure(restored.error);
		await refresh();
	};

	return {
		/** Id of the row that is being worked on. */
		get busyId() {
			return busyId;
		},
		/** True when the new name stands. */
		rename: (section: SectionSummary, name: string): Promise<boolean> =>
			during(section.id, async () => {
				const renamed = await updateSection(section.id, { version: section.version, name });
				if (!renamed.ok) tellFailure(renamed.error);
				if (renamed.ok || renamed.error.conflict) await refresh();
				return renamed.ok;
			}),
		remove: (section: SectionSummary): Promise<void> =>
			during(section.id, async () => {
				const removed = await deleteSection(section.id);
				if (removed.ok)
					toasts.show(`“${section.name}” is off the Rack.`, { undo: () => bringBack(section) });
				else tellFailure(removed.error);
				await refresh();
			})
	};
};
export type RackDeeds = ReturnType<typeof rackDeeds>;
