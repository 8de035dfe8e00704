import path from 'node:path';

/** @typedef {{ rooms: readonly string[], packages: 'any' | 'none' | readonly string[] }} Doors */

const pages = ['api', 'components', 'drawing', 'engine', 'units', 'workers'];

/**
 * Who may import whom: from each room, the other rooms and the packages it may use. The same table
 * stands in DEVELOPERS.md.
 * @type {Readonly<Record<string, Doors>>}
 */
export const doors = {
	engine: { rooms: ['engine'], packages: 'none' },
	units: { rooms: ['units'], packages: 'none' },
	workers: { rooms: ['engine', 'workers'], packages: 'none' },
	drawing: { rooms: ['drawing', 'engine', 'units'], packages: ['d3'] },
	api: { rooms: ['api', 'engine', 'units'], packages: 'any' },
	components: { rooms: pages, packages: 'any' },
	server: { rooms: ['api', 'drawing', 'engine', 'server', 'units'], packages: 'any' },
	pages: { rooms: [...pages, 'pages'], packages: 'any' },
	'server routes': {
		rooms: ['api', 'drawing', 'engine', 'server', 'server routes', 'units'],
		packages: 'any'
	}
};

/**
 * Folders that may use packages their room may not.
 * @type {Readonly<Record<string, readonly string[]>>}
 */
const packagesWithin = { 'src/lib/engine/geometry/mesh/': ['delaunator'] };

/**
 * Packages a file may use: its room's, or its folder's own.
 * @param {string} file from the top of the clone
 * @param {Doors} doorsOfRoom
 * @returns {Doors['packages']}
 */
export const packagesFor = (file, { packages }) => {
	const folder = Object.keys(packagesWithin).find((name) => file.startsWith(name));
	return folder === undefined ? packages : (packagesWithin[folder] ?? packages);
};

const isServerFile = (/** @type {string} */ file) =>
	/(^|\/)\+server\.ts$|\.server(\.ts)?$/.test(file);

/**
 * The room of a file, by its path from the top of the clone; null for files outside the rooms.
 * @param {string} file
 */
export const roomOf = (file) => {
	const place = file.split(path.sep).join('/');
	if (/\.test\.ts$/.test(place)) return null;
	const room = /^src\/lib\/([^/]+)\//.exec(place)?.[1];
	if (room !== undefined) return room in doors ? room : null;
	if (!place.startsWith('src/')) return null;
	if (isServerFile(place)) return 'server routes';
	return place.startsWith('src/routes/') ? 'pages' : null;
};

/**
 * The path from the top of the clone that an import names, or null when it names a package.
 * @param {string} source
 * @param {string} importer path from the top of the clone
 */
export const importedFile = (source, importer) => {
	if (source === './$types') return importer;
	if (source === '$lib' || source.startsWith('$lib/')) return `src/lib${source.slice(4)}`;
	if (!source.startsWith('.')) return null;
	return path.posix.join(path.posix.dirname(importer), source);
};

/**
 * @param {Doors['packages']} allowed
 * @param {string} source
 */
export const mayUsePackage = (allowed, source) => {
	if (allowed === 'any') return true;
	if (allowed === 'none') return false;
	return allowed.some((name) => source === name || source.startsWith(`${name}-`));
};
