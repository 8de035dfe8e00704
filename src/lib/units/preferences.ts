/** Which units a person reads and types, and which mark parts whole from fraction. */
export interface Preferences {
	system: 'si' | 'us';
	decimal: 'point' | 'comma';
}

export const defaultPreferences: Preferences = { system: 'si', decimal: 'point' };

/** Name of the cookie that keeps the choice between visits; the server reads it too. */
export const preferencesCookie = 'flangewright-preferences';

/** `si.comma`: short, safe in a cookie. */
export const preferencesText = (preferences: Preferences): string =>
	`${preferences.system}.${preferences.decimal}`;

/** Reads `preferencesText` back; anything unknown falls to the default, part by part. */
export function preferencesFrom(text: string | undefined | null): Preferences {
	const [system, decimal] = (text ?? '').split('.');
	return {
		system: system === 'us' ? 'us' : defaultPreferences.system,
		decimal: decimal === 'comma' ? 'comma' : defaultPreferences.decimal
	};
}
