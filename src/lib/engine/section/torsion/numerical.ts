import type { Loop, Point } from '../../geometry/boundary';
import { frameAt, pointIn } from '../../geometry/frame';
import { nodeOrder } from '../../geometry/mesh/node-order';
import { cutLoops, placedLoops } from '../../geometry/mesh/placed-loops';
import { quadraticMesh, type QuadraticMesh } from '../../geometry/mesh/quadratic-mesh';
import { sizeField, sizeSources } from '../../geometry/mesh/size-field';
import { elementStiffness } from '../../geometry/mesh/stiffness';
import { triangulating } from '../../geometry/mesh/triangulation';
import type { Note } from '../../result';
import { contact } from '../../tolerances';
import type { PreparedSection } from '../prepared';
import type { TorsionFigures } from '../shape';
import { mergedPlates } from './merged-plates';
import { torsionBelow } from './stress-function';
import { warpingFigures, warpingFunction } from './warping-function';

/** Torsion by elements: figures, how sure they are, and what the mesh was. */
export interface NumericalTorsion extends TorsionFigures {
	readonly torsionConstant: number;
	readonly error: {
		/** Bounds of the torsion constant, mm⁴: it lies between them. */
		readonly torsionBelow: number;
		readonly torsionAbove: number;
		/** Half the distance between the bounds as a share of the torsion constant. */
		readonly torsionShare: number;
	};
	readonly nodes: number;
	readonly notes: readonly Note[];
}

/** Figures, or the reason why there are none. */
export type NumericalTorsionOutcome = NumericalTorsion | { readonly notes: readonly Note[] };

/**
 * A mesh of too many points takes too long: it is then made coarser, and the bounds tell what that
 * costs. The last one has little more than the outline's own points.
 */
const attempts = [
	{ coarser: 1, mostPoints: 1200 },
	{ coarser: 1.6, mostPoints: 1200 },
	{ coarser: 2.6, mostPoints: 1600 },
	{ coarser: 4, mostPoints: 2500 }
] as const;

/**
 * Saint-Venant's torsion of any section, solved on quadratic triangles with true arcs: torsion constant
 * mm⁴ (the middle between a bound from above and one from below), warping constant mm⁶ about the
 * shear centre, and shear centre from the definition's origin (Trefftz). All parts are taken to have
 * the same shear modulus, and parts that touch along an edge to be one. Pure and deterministic. A
 * generator, so that it can pause: it yields every few milliseconds.
 */
export function* torsionSolving(
	section: PreparedSection
): Generator<void, NumericalTorsionOutcome> {
	const { contours, bounds, gross } = section;
	const merged = mergedPlates(section.definition);
	if (merged.unjoined) return { notes: merged.notes };
	const scale = Math.hypot(bounds.right - bounds.left, bounds.top - bounds.bottom);
	const frame = frameAt(gross.centroid, (gross.principalAngle * Math.PI) / 180);
	const mesh = yield* meshing(cutLoops(placedLoops(contours, frame, scale), contact.ofSize));
	const stiffness = mesh && elementStiffness(mesh);
	if (!mesh || !stiffness) return { notes: [noMesh] };
	yield;
	const solved = yield* solving(mesh, stiffness);
	const inPlace = ({ y, z }: Point) => pointIn(frame, y * scale, z * scale);
	const whole = mesh.pieces === 1;
	const [below, above] = [solved.below * scale ** 4, solved.torsionAbove * scale ** 4];
	return {
		torsionConstant: (below + above) / 2,
		warpingConstant: whole ? solved.warpingConstant * scale ** 6 : null,
		shearCentre: whole ? inPlace(solved.shearCentre) : null,
		error: {
			torsionBelow: below,
			torsionAbove: above,
			torsionShare: (above - below) / (above + below)
		},
		nodes: mesh.y.length,
		notes: [...merged.notes, ...notesOf(section, whole)]
	};
}

/** The same solution at once. */
export function numericalTorsion(section: PreparedSection): NumericalTorsionOutcome {
	const steps = torsionSolving(section);
	for (;;) {
		const { done, value } = steps.next();
		if (done) return value;
	}
}

function* meshing(loops: readonly Loop[]): Generator<void, QuadraticMesh | null> {
	const sources = sizeSources(loops);
	yield;
	for (const { coarser, mostPoints } of attempts) {
		const mesh = yield* triangulating(loops, sizeField(sources, coarser), mostPoints);
		if (typeof mesh === 'object') return quadraticMesh(mesh);
	}
	return null;
}

function* solving(mesh: QuadraticMesh, stiffness: Float64Array) {
	const order = nodeOrder(mesh.elements, mesh.y.length);
	yield;
	const warping = warpingFunction(mesh, stiffness, order);
	yield;
	const figures = warpingFigures(mesh, warping);
	yield;
	return { ...figures, below: torsionBelow(mesh, stiffness, order) };
}

const noMesh: Note = {
	code: 'torsion-not-covered',
	message: 'The outline is too fine for the numerical torsion solution: no torsion figures from it.'
};

function notesOf({ parts }: PreparedSection, whole: boolean): Note[] {
	const notes: Note[] = [];
	if (!whole)
		notes.push({
			code: 'torsion-separate-pieces',
			message:
				'The section falls into pieces that do not touch along an edge: the torsion constant is the sum of theirs, as if nothing tied them; warping constant and shear centre are not given.'
		});
	if (parts.some(({ material }) => material.E !== parts[0]!.material.E))
		notes.push({
			code: 'torsion-one-modulus',
			message:
				'Parts differ in elastic modulus; the torsion figures take the same shear modulus everywhere.'
		});
	return notes;
}
