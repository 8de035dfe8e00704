import type { Issue } from '../../result';
import { coordinateIssues } from '../coordinates';
import type { Plate, PlatesSection } from '../definition';
import { needed, radius, sizeIssues } from '../sizes';

/** What is wrong with the plates one by one, and with the names of the joins. */
export function plateIssues({ plates, joins = [] }: PlatesSection): Issue[] {
	if (!Array.isArray(plates) || plates.length === 0)
		return [{ path: 'plates', message: 'A section of plates needs at least one plate.' }];
	const names = plates.map(({ name }) => name);
	const known = new Set(names);
	return [
		...plates.flatMap((plate, i) => onePlateIssues(plate, i, names)),
		...joins.flatMap((join, i) => [
			...(['a', 'b'] as const).flatMap((end) =>
				known.has(join[end])
					? []
					: [{ path: `joins.${i}.${end}`, message: `There is no plate “${join[end]}” to join.` }]
			),
			...sizeIssues([radius(`joins.${i}.weldLeg`, 'Weld leg', join.weldLeg)])
		])
	];
}

function onePlateIssues(plate: Plate, i: number, names: readonly string[]): Issue[] {
	const path = `plates.${i}`;
	const { name } = plate;
	const called = typeof name === 'string' && name !== '' ? `Plate “${name}”` : `Plate ${i + 1}`;
	const issues = [
		...sizeIssues([
			needed(`${path}.width`, `${called}: width`, plate.width),
			needed(`${path}.thickness`, `${called}: thickness`, plate.thickness)
		]),
		...coordinateIssues(`${path}.y`, `${called}: y`, plate.y),
		...coordinateIssues(`${path}.z`, `${called}: z`, plate.z)
	];
	if (typeof plate.angle !== 'number' || !Number.isFinite(plate.angle))
		issues.push({ path: `${path}.angle`, message: `${called}: angle must be a number.` });
	if (typeof name !== 'string' || name === '')
		issues.push({ path: `${path}.name`, message: `${called} needs a name.` });
	else if (names.indexOf(name) !== i)
		issues.push({ path: `${path}.name`, message: `Two plates are called “${name}”.` });
	return issues;
}

/** Joins between plates that do not touch, each with its place in the list. */
export function joinIssues(
	{ plates, joins = [] }: PlatesSection,
	touching: readonly (readonly [number, number])[]
): (Issue & { join: number })[] {
	const pairs = new Set(touching.map(([i, j]) => pairKey(plates[i]!.name, plates[j]!.name)));
	return joins.flatMap(({ a, b }, i) =>
		pairs.has(pairKey(a, b))
			? []
			: [
					{
						join: i,
						path: `joins.${i}`,
						message: `Plates “${a}” and “${b}” are to be joined but do not touch.`
					}
				]
	);
}

const pairKey = (a: string, b: string): string => JSON.stringify([a, b].sort());
