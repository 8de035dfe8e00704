/** As much of the signed-in person as the bar shows. */
export interface PersonAtScreen {
	name: string;
	email: string;
	firm: { id: string; name: string } | null;
	role: string | null;
	memberships: readonly { firm: { id: string; name: string } }[];
}

/** At most two initials: first and last name. */
export function initials(name: string): string {
	const words = name.split(/\s+/).filter(Boolean);
	const picked = words.length > 1 ? [words[0], words.at(-1)] : words;
	return picked.map((word) => [...(word ?? '')][0]?.toUpperCase() ?? '').join('');
}
