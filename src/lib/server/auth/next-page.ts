/** Where to go after signing in: a path of this site, never another site. */
export const nextPage = (wish: string | null | undefined, otherwise = '/rack'): string => {
	if (!wish || !/^\/(?![/\\])/.test(wish)) return otherwise;
	const url = URL.parse(wish, 'http://here.invalid');
	return url?.host === 'here.invalid' ? `${url.pathname}${url.search}${url.hash}` : otherwise;
};
