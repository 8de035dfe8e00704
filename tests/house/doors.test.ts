import path from 'node:path';
import { ESLint, Linter } from 'eslint';
import { expect, test } from 'vitest';
import { doorsRule, wrongImport } from '../../scripts/eslint/doors.js';

test('names the wrong import, the two rooms and the doors there are', () => {
	expect(wrongImport('src/lib/engine/section/prepare.ts', '$lib/components/ui/Button.svelte')).toBe(
		"engine may not import from components: '$lib/components/ui/Button.svelte'. Its doors lead to engine."
	);
});

test('sees through relative paths', () => {
	expect(wrongImport('src/lib/drawing/axis.ts', '../server/db/connection')).toContain('server');
	expect(wrongImport('src/lib/drawing/axis.ts', '../engine/result')).toBeNull();
});

test('the engine and the units use no packages, the drawing only d3', () => {
	for (const name of ['svelte', 'node:fs', '$app/environment', 'zod'])
		expect(wrongImport('src/lib/engine/result.ts', name)).toContain(name);
	expect(wrongImport('src/lib/drawing/axis.ts', 'd3-shape')).toBeNull();
	expect(wrongImport('src/lib/drawing/axis.ts', 'layercake')).toContain('layercake');
});

test('only the mesh of the engine uses the triangulation package', () => {
	expect(wrongImport('src/lib/engine/geometry/mesh/triangulation.ts', 'delaunator')).toBeNull();
	expect(wrongImport('src/lib/engine/geometry/mesh/triangulation.ts', 'zod')).toContain('zod');
	for (const file of ['geometry/loops.ts', 'section/torsion/numerical.ts'])
		expect(wrongImport(`src/lib/engine/${file}`, 'delaunator')).toContain('delaunator');
});

test('a page keeps out of the server, a server route out of the components', () => {
	const queries = '$lib/server/queries/people';
	expect(wrongImport('src/routes/bench/+page.svelte', queries)).toContain('server');
	expect(wrongImport('src/routes/bench/+page.server.ts', queries)).toBeNull();
	expect(wrongImport('src/routes/api/v1/analyse/+server.ts', queries)).toBeNull();
	expect(wrongImport('src/routes/rack/+page.server.ts', '$lib/components/Rack.svelte')).toContain(
		'components'
	);
	expect(wrongImport('src/hooks.server.ts', queries)).toBeNull();
});

test('tests may import anything', () => {
	expect(wrongImport('src/lib/engine/result.test.ts', '$lib/server/log')).toBeNull();
	expect(wrongImport('tests/api/analyse.test.ts', '../../src/lib/server/log')).toBeNull();
});

test('the rule marks the import where it stands', () => {
	const text = "import '$lib/server/log';\nimport './result';\n";
	const config = {
		plugins: { house: { rules: { doors: doorsRule } } },
		rules: { 'house/doors': 2 }
	};
	const found = new Linter().verify(text, config as Linter.Config, {
		filename: path.resolve('src/lib/engine/result.js')
	});
	expect(found.map(({ line, message }) => [line, message])).toEqual([
		[1, expect.stringContaining('engine may not import from server')]
	]);
});

test.each([
	'src/lib/engine/result.ts',
	'src/routes/bench/+page.svelte',
	'tests/house/doors.test.ts'
])('%s is linted for doors and export *', { timeout: 60_000 }, async (file) => {
	const config: Linter.Config = await new ESLint().calculateConfigForFile(file);
	expect(config.rules?.['house/doors']).toEqual([2]);
	expect(JSON.stringify(config.rules?.['no-restricted-syntax'])).toContain('ExportAllDeclaration');
});
