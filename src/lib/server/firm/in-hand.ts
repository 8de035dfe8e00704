import { noFirm, type FirmInHand } from '../../api/firm-settings';
import { may } from '../rights/may';
import type { Person } from '../rights/person';
import { defaultStock } from './default-stock';
import { readFirm } from './settings';

/** The firm of the person at the screen as pages need it; the defaults for everybody else. */
export const firmInHand = async (person: Person | null): Promise<FirmInHand> => {
	const read = person?.firm ? await readFirm(person) : null;
	if (!read?.ok) return noFirm(defaultStock());
	return { ...read.value, mayUpdate: may(person, 'settings.update') };
};
