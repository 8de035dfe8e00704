import type { Note } from '../result';
import type { SectionKind } from '../section/definition';
import type { Standard } from './result';

const kindWords: Readonly<Record<SectionKind, string>> = {
	i: 'I sections',
	channel: 'channels',
	tee: 'tees',
	angle: 'angles',
	'rectangular-hollow': 'rectangular hollow sections',
	'circular-hollow': 'circular hollow sections',
	box: 'boxes',
	flat: 'flat bars',
	round: 'round bars',
	plates: 'free plates',
	outline: 'outlines'
};

/** A kind without class limits: its first yield and full plastic moment are properties only. */
export function classNotBuilt(kind: SectionKind): Note {
	if (kind === 'outline')
		return {
			code: 'class-not-built',
			message:
				'An outline does not say which of its parts are plates, so it has no class and no resistance. First yield and full plastic are properties of the shape only.'
		};
	return {
		code: 'class-not-built',
		message: `The class of ${kindWords[kind]} is not built yet, so there is no resistance. First yield and full plastic are properties of the section only.`,
		clause: 'EN 1993-1-1:2005 5.5'
	};
}

export const codeNotBuilt = (standard: Standard): Note => ({
	code: 'code-not-built',
	message: `${standard} is not built yet: no class and no resistance are given. Choose EN 1993-1-1:2005 for figures by that code.`
});
