import { equilibrium } from '../tolerances';
import { bendingStiffness, type Bender, type Bent, type Forces } from './bender';
import type { ElasticPath } from './elastic-path';
import { isWithinReach } from './limits';
import { risingRoot } from './rising-root';
import type { StrainPlane, Transverse } from './state';

/** The balanced plane whose moment about the axis is M (N·mm); undefined when there is none. */
export function bentAtMoment(
	b: Forces,
	transverse: Transverse,
	elastic: Pick<ElasticPath, 'moment'>,
	bent: (curvature: number) => Bent,
	M: number
): Bent | undefined {
	const { squash, reach } = b.mechanics;
	const atZero = elastic.moment(0);
	const stiffness = (elastic.moment(1 / reach) - atZero) * reach;
	let found: Bent | undefined;
	const root = risingRoot(
		(curvature) => {
			const state = bent(curvature);
			const value = state.forces.M - M;
			if (!found || Math.abs(value) < Math.abs(found.forces.M - M)) found = state;
			return { value, slope: bendingStiffness(state.forces, transverse) };
		},
		(M - atZero) / stiffness,
		Math.abs(M) / stiffness + (squash * reach) / stiffness,
		2e-15 * squash * reach
	);
	const balanced = Math.abs(root.value) <= equilibrium * squash * reach;
	const reached = isWithinReach(b.mechanics, root.x);
	return balanced && reached && found?.converged ? found : undefined;
}

/** A whole strain plane, whatever forces it gives. */
export function bentByPlane(
	b: Pick<Bender, 'angle' | 'evaluate'>,
	{ e0, ky, kz }: StrainPlane
): Bent {
	const [c, s] = [Math.cos(b.angle), Math.sin(b.angle)];
	const curvature = (ky * c + kz * s) * 1e-3;
	const turn = (kz * c - ky * s) * 1e-3;
	const forces = b.evaluate(e0, curvature, turn);
	const converged = Number.isFinite(forces.N + forces.M + forces.T);
	return { e0, curvature, turn, forces, converged };
}
