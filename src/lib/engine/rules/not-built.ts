import type { Note } from '../result';
import type { Standard } from './result';

/** An outline has no class: its first yield and full plastic moment are properties only. */
export const outlineNotClassed: Note = {
	code: 'class-not-built',
	message:
		'An outline does not say which of its parts are plates, so it has no class and no resistance but to tension. First yield and full plastic are properties of the shape only.'
};

export const codeNotBuilt = (standard: Standard): Note => ({
	code: 'code-not-built',
	message: `${standard} is not built yet: no class and no resistance are given. Choose EN 1993-1-1 for figures by that code.`
});
