import path from 'node:path';
import { root } from '../lib/paths.js';
import { doors, importedFile, mayUsePackage, packagesFor, roomOf } from './rooms.js';

/**
 * What is wrong with an import, or null.
 * @param {string} importer path from the top of the clone
 * @param {string} source as written
 */
export const wrongImport = (importer, source) => {
	const room = roomOf(importer);
	const door = room === null ? undefined : doors[room];
	if (room === null || !door) return null;
	const file = importedFile(source, importer);
	if (file === null)
		return mayUsePackage(packagesFor(importer, door), source)
			? null
			: `${room} may not use the package '${source}'.`;
	const other = roomOf(file);
	if (other === null || door.rooms.includes(other)) return null;
	return `${room} may not import from ${other}: '${source}'. Its doors lead to ${door.rooms.join(', ')}.`;
};

/** @type {import('eslint').Rule.RuleModule} */
export const doorsRule = {
	meta: {
		type: 'problem',
		docs: { description: 'Rooms import only through their doors (DEVELOPERS.md)' },
		schema: [],
		messages: { wrong: '{{ what }}' }
	},
	create: (context) => {
		const importer = path.relative(root, context.filename).split(path.sep).join('/');
		const check = (/** @type {import('estree').Node | null | undefined} */ source) => {
			if (source?.type !== 'Literal' || typeof source.value !== 'string') return;
			const what = wrongImport(importer, source.value);
			if (what) context.report({ node: source, messageId: 'wrong', data: { what } });
		};
		return {
			ImportDeclaration: (node) => check(node.source),
			ImportExpression: (node) => check(node.source),
			ExportNamedDeclaration: (node) => check(node.source),
			ExportAllDeclaration: (node) => check(node.source)
		};
	}
};
