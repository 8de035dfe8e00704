import { afterEach, expect, it } from 'vitest';
import { preferencesCookie, preferencesFrom } from '$lib/units';
import { createPreferences } from './preferences.svelte';

const kept = () =>
	preferencesFrom(document.cookie.match(new RegExp(`${preferencesCookie}=([^;]*)`))?.[1]);

afterEach(() => {
	document.cookie = `${preferencesCookie}=; path=/; max-age=0`;
});

it('changes what is named, keeps the rest and remembers both in the cookie', () => {
	const preferences = createPreferences({ system: 'us', decimal: 'point' });
	preferences.choose({ decimal: 'comma' });
	expect([preferences.system, preferences.decimal]).toEqual(['us', 'comma']);
	expect(kept()).toEqual({ system: 'us', decimal: 'comma' });
});
