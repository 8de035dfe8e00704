const fold = (text: string) =>
	text.normalize('NFKC').toLowerCase().replaceAll('×', 'x').replaceAll(/\s+/g, ' ').trim();

/** What makes a section one and the same on a Rack: designation and standard, as people read them. */
export const sectionIdentity = (name: string, standard: string): string =>
	`${fold(standard)}|${fold(name)}`;
