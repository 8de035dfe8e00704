import type { Role } from './roles';

export interface Firm {
	id: string;
	name: string;
	demo: boolean;
}

export interface Membership {
	firm: Firm;
	role: Role;
}

/** The signed-in person, in `locals.person`; read from the database on each request. */
export interface Person {
	id: string;
	name: string;
	email: string;
	memberships: readonly Membership[];
	/** The firm in hand; null for a person who belongs to none. */
	firm: Firm | null;
	/** Role in the firm in hand. */
	role: Role | null;
}
