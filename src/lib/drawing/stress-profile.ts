import type { StressStrainLaw } from '$lib/engine/material/law';
import type { Part } from '$lib/engine/section/prepared';
import { extentOf, type TurnedFrame } from './turned-frame';

/** Strain falls linearly with height: strain = atOrigin − curvature × depth (1/mm, mm). */
export interface StrainLine {
	readonly atOrigin: number;
	readonly curvature: number;
}

/** A part of the section over its own depth in the turned frame, mm. */
export interface DepthPart {
	readonly name: string;
	readonly top: number;
	readonly bottom: number;
	readonly law: StressStrainLaw;
	readonly fy: number;
	readonly fyc: number;
}

export interface StressKnot {
	readonly depth: number;
	/** N/mm² */
	readonly stress: number;
}

/** A stretch of depth where steel is beyond the first line of its law. */
export interface YieldedBand {
	readonly top: number;
	readonly bottom: number;
	readonly sense: 'tension' | 'compression';
}

/** Stress over the depth of one part, from its top down. */
export interface PartStress {
	readonly part: DepthPart;
	readonly knots: readonly StressKnot[];
	readonly yielded: readonly YieldedBand[];
	/** Its stress follows from its past: parts of one steel may differ at one depth. */
	readonly past?: boolean;
}

export const strainAt = (line: StrainLine, depth: number) => line.atOrigin - line.curvature * depth;

export function depthParts(parts: readonly Part[], frame: TurnedFrame): DepthPart[] {
	return parts.map(({ name, region, material }) => {
		const { top, bottom } = extentOf(frame, region.loops);
		return { name, top, bottom, law: material.law, fy: material.fy, fyc: material.fyc };
	});
}

/** Stress of a piecewise-linear law at a strain, N/mm². */
export function lawStress(law: StressStrainLaw, strain: number): number {
	let segment = 0;
	while (segment < law.kinks.length && strain > (law.kinks[segment] ?? 0)) segment += 1;
	return (law.offsets[segment] ?? 0) + (law.slopes[segment] ?? 0) * strain;
}

/** Exact polyline of stress over one part: knots at its edges and wherever its law kinks. */
export function partStress(part: DepthPart, line: StrainLine): PartStress {
	const inner = [...part.law.kinks, 0]
		.map((strain) => depthAt(line, strain))
		.filter((depth): depth is number => depth !== null && depth < part.top && depth > part.bottom);
	const depths = [part.top, ...inner.sort((a, b) => b - a), part.bottom];
	const knots = depths.map((depth) => ({
		depth,
		stress: lawStress(part.law, strainAt(line, depth))
	}));
	return { part, knots, yielded: yieldedBands(part, line) };
}

/** Height at which a strain is reached; null when the strain is the same everywhere. */
export const depthAt = (line: StrainLine, strain: number): number | null =>
	line.curvature === 0 ? null : (line.atOrigin - strain) / line.curvature;

function yieldedBands(part: DepthPart, line: StrainLine): YieldedBand[] {
	const tension = bandBeyond(part, line, part.law.yieldTension, 1);
	const compression = bandBeyond(part, line, -part.law.yieldCompression, -1);
	return [tension, compression].filter((band): band is YieldedBand => band !== null);
}

function bandBeyond(
	part: DepthPart,
	line: StrainLine,
	limit: number,
	sign: 1 | -1
): YieldedBand | null {
	const beyond = (depth: number) => (strainAt(line, depth) - limit) * sign;
	const [atTop, atBottom] = [beyond(part.top), beyond(part.bottom)];
	const sense = sign > 0 ? 'tension' : 'compression';
	if (atTop <= 0 && atBottom <= 0) return null;
	if (atTop > 0 && atBottom > 0) return { top: part.top, bottom: part.bottom, sense };
	const front = depthAt(line, limit) ?? part.bottom;
	return atTop > 0
		? { top: part.top, bottom: front, sense }
		: { top: front, bottom: part.bottom, sense };
}
