/** What pressing Save means: sign in first, give a name first, or save over what is open. */
export function saveAct(signedIn: boolean, saved: boolean): 'sign-in' | 'name' | 'over' {
	if (!signedIn) return 'sign-in';
	return saved ? 'over' : 'name';
}
