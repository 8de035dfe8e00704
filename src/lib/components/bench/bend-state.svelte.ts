import { bending, type Bending } from '$lib/engine/response/respond';
import type { ResponseState } from '$lib/engine/response/state';
import type { PreparedSection } from '$lib/engine/section/prepared';
import type { StrainLine } from '$lib/drawing/stress-profile';
import type { BendChoice } from './study';
import { curvatureForStrain } from './strain-drag';

/** Reach of slider, keys and handle, in multiples of the curvature at first yield. */
export const mostRatio = 10;
/** Reach of what is typed. */
const mostTyped = 1000;

const clamp = (value: number, most: number) => Math.max(-most, Math.min(most, value));

/** How the section is bent now, and the state that follows; bending touches nothing above it. */
export class BendState {
	axisAngle = $state(0);
	transverse = $state<BendChoice['transverse']>('moment-zero');
	#ratio = $state(0);
	readonly #section: () => PreparedSection;
	readonly #axial: () => number;

	/** `axial`: N held while bending, kN. */
	constructor(section: () => PreparedSection, axial: () => number, first: BendChoice) {
		this.#section = section;
		this.#axial = axial;
		this.axisAngle = first.axisAngle;
		this.transverse = first.transverse;
		this.#ratio = first.ratio;
	}

	readonly bender: Bending = $derived.by(() =>
		bending(this.#section(), {
			axisAngle: this.axisAngle,
			transverse: this.transverse,
			N: this.#axial()
		})
	);

	/** Curvature at first yield, 1/m; where N alone yields the section, that of yield at mid-depth free of N. */
	readonly unit: number = $derived.by(() => this.bender.firstYield.curvature ?? this.#roughUnit());

	get ratio(): number {
		return this.#ratio;
	}

	/** 1/m */
	get curvature(): number {
		return this.#ratio * this.unit;
	}

	readonly state: ResponseState = $derived.by(() => this.bender.atCurvature(this.curvature));

	/** Direction of the level line on the drawing: the neutral axis, or the asked axis when there is none. */
	readonly seenAngle: number = $derived.by(() =>
		levelAngle(this.state.neutralAxis?.angle ?? this.axisAngle, this.axisAngle)
	);

	/** Strain over the depth as drawn; all zero where no state exists. */
	readonly line: StrainLine = $derived.by(() => strainLine(this.state, this.seenAngle));

	bendTo(ratio: number): void {
		if (Number.isFinite(ratio)) this.#ratio = clamp(ratio, mostRatio);
	}

	/** Bends to a typed curvature, 1/m. */
	bendToCurvature(curvature: number): void {
		if (Number.isFinite(curvature)) this.#ratio = clamp(curvature / this.unit, mostTyped);
	}

	/** Bends to a typed moment, kNm; false when no state carries it. */
	bendToMoment(moment: number): boolean {
		const found = this.bender.atMoment(moment);
		if (found.curvature === null) return false;
		this.#ratio = clamp(found.curvature / this.unit, mostTyped);
		return true;
	}

	/** Bends until the strain `depth` mm above the centroid, square to the neutral axis, is `strain`. */
	bendToStrain(depth: number, strain: number): void {
		const at = { angle: this.seenAngle, depth };
		const curvature = curvatureForStrain(this.bender, this.curvature, this.unit, at, strain);
		this.bendTo(curvature / this.unit);
	}

	#roughUnit(): number {
		const { parts, bounds } = this.#section();
		const strain = Math.min(...parts.map(({ material }) => material.law.yieldTension));
		return (strain / Math.max(bounds.top - bounds.bottom, bounds.right - bounds.left)) * 2000;
	}
}

/**
 * The direction of a line as an angle within 90° of the asked axis, so that positive bending always
 * has its tension at the bottom of the drawing; free of the last digits' noise.
 */
function levelAngle(degrees: number, asked: number): number {
	const apart = degrees - asked;
	const turned = asked + apart - 180 * Math.ceil((apart - 90) / 180);
	return Math.round(turned * 1e6) / 1e6 + 0;
}

function strainLine({ e0, ky, kz }: ResponseState, angle: number): StrainLine {
	const radians = (angle * Math.PI) / 180;
	const across = (ky ?? 0) * Math.cos(radians) + (kz ?? 0) * Math.sin(radians);
	return { atOrigin: e0 ?? 0, curvature: across * 1e-3 };
}
