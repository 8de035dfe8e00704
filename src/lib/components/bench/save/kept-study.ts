const key = 'flangewright.study';

/** The last unsaved study of this tab, as the text of an address; null when there is none. */
export function keptStudy(): string | null {
	try {
		return sessionStorage.getItem(key);
	} catch {
		return null;
	}
}

/** Keeps a study for this tab; null forgets it. Where storage is refused, nothing is kept. */
export function keepStudy(text: string | null): void {
	try {
		if (text === null) sessionStorage.removeItem(key);
		else sessionStorage.setItem(key, text);
	} catch {
		// A browser may forbid storage: the address still carries the study.
	}
}
