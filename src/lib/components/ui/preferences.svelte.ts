import { getContext, hasContext, setContext } from 'svelte';
import {
	defaultPreferences,
	preferencesCookie,
	preferencesText,
	type Preferences
} from '$lib/units';

const KEY = Symbol('preferences');
const YEAR_IN_SECONDS = 31_536_000;

/** Units and decimal mark of the person at the screen; reading them in markup follows a change. */
export interface PreferencesState extends Readonly<Preferences> {
	/** Changes what is named and remembers the whole in a cookie. */
	choose(change: Partial<Preferences>): void;
}

function remember(preferences: Preferences) {
	const secure = location.protocol === 'https:' ? '; secure' : '';
	document.cookie = `${preferencesCookie}=${preferencesText(preferences)}; path=/; max-age=${YEAR_IN_SECONDS}; samesite=lax${secure}`;
}

export function createPreferences(initial: Preferences = defaultPreferences): PreferencesState {
	let system = $state(initial.system);
	let decimal = $state(initial.decimal);
	return {
		get system() {
			return system;
		},
		get decimal() {
			return decimal;
		},
		choose(change) {
			system = change.system ?? system;
			decimal = change.decimal ?? decimal;
			remember({ system, decimal });
		}
	};
}

/** Gives the preferences to every component below; called once, in the root layout. */
export const providePreferences = (initial: Preferences): PreferencesState =>
	setContext(KEY, createPreferences(initial));

/** The preferences of the page; the defaults where no layout gave any. Call while initialising. */
export const usePreferences = (): PreferencesState =>
	hasContext(KEY) ? getContext<PreferencesState>(KEY) : createPreferences();
