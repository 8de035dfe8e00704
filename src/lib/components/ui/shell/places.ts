/** The places of the program, in the order of the bar. */
export const places = [
	{ path: '/bench', name: 'Bench' },
	{ path: '/rack', name: 'Rack' },
	{ path: '/line-up', name: 'Line-up' },
	{ path: '/bolt-groups', name: 'Bolt groups' },
	{ path: '/sheets', name: 'Sheets' },
	{ path: '/crew', name: 'Crew' }
] as const;

/** True on the place itself and on everything under it, not on names that merely begin alike. */
export const isWithin = (pathname: string, path: string): boolean =>
	pathname === path || pathname.startsWith(`${path}/`);
