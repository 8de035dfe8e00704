import type { Person } from '../rights/person';

declare global {
	namespace App {
		interface Locals {
			/** Who is signed in, read from the database for this request; null for a visitor. */
			person: Person | null;
		}
	}
}

export {};
