import { changesTold } from './allowed-code';
import { underPreset, type Preset } from './firm/preset';
import { openingBend, openingStudy } from './study';
import { addressedStudy, addressText, studyParameter, type Addressed } from './study-address';

export interface Opened {
	readonly addressed: Addressed;
	/** Why the study in the address was not opened; empty when it was, or when there was none. */
	readonly notice: string;
	/** What was changed of it on opening; empty when nothing was. */
	readonly adjusted: string;
	/** A new study under the firm's own code choices. */
	readonly fromPreset: boolean;
}

export const openingAddressed: Addressed = { study: openingStudy, bend: openingBend };

/** The study that an address carries, or the ready plate girder, under the firm's preset if it has one. */
export function openedStudy(parameters: URLSearchParams, preset?: Preset | null): Opened {
	const text = parameters.get(studyParameter);
	if (text === null) {
		const addressed = preset
			? { ...openingAddressed, study: underPreset(openingStudy, preset) }
			: openingAddressed;
		return { addressed, notice: '', adjusted: '', fromPreset: Boolean(preset) };
	}
	const read = addressedStudy(text);
	if (read.ok) {
		const { study, bend, changes = [] } = read.value;
		return {
			addressed: { study, bend },
			notice: '',
			adjusted: changesTold(changes),
			fromPreset: false
		};
	}
	return {
		addressed: openingAddressed,
		adjusted: '',
		fromPreset: false,
		notice: `${read.error} A plate girder is opened instead.`
	};
}

/** Path of the Bench with a study in it; plain for the study it opens with. */
export function benchPath(addressed: Addressed): string {
	const text = addressText(addressed);
	return text === addressText(openingAddressed) ? '/bench' : `/bench?${studyParameter}=${text}`;
}

/** Longest path that is put in the address: the head of a request ends at 16 KB, cookies in it. */
const longestPath = 12_000;

/** What of a path the address carries: without its study where that is too long. */
export const carriedPath = (path: string): string => (path.length > longestPath ? '/bench' : path);
