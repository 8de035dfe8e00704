import { exampleWorks, notCovered } from './examples/list';
import { workedExamples } from './examples/worked-example';

/** Something that is not held against a published value, and why. */
export interface Gap {
	readonly what: string;
	readonly why: string;
}

/** Rules and figures that the engine does not have; its answers say so by a note. */
export const rulesLeftOut: readonly Gap[] = [
	{
		what: 'AISC 360, CSA S16, AS 4100, IS 800',
		why: 'Not built: class, resistance and checks are null under these codes.'
	},
	{
		what: 'Longitudinal stiffeners of webs and flanges (EN 1993-1-5 4.5, A.1, A.2)',
		why: 'Not built: panels run from flange to flange.'
	},
	{
		what: 'Round tubes of class 4 (EN 1993-1-6)',
		why: 'Not built: nothing is counted for them.'
	},
	{
		what: 'Buckling of the member in compression, and with bending (EN 1993-1-1:2005 6.3.1, 6.3.3)',
		why: 'Not built: resistances are of the cross-section, and a note says so.'
	},
	{
		what: 'Lateral–torsional buckling of tees, angles, bars, free plates, outlines and boxes of unequal flanges (6.3.2)',
		why: 'Not built: the moment is then not counted where an unbraced length is given.'
	},
	{
		what: 'Shear lag factors (EN 1993-1-5 3.2, 3.3)',
		why: 'The span is not known: a note gives the length above which shear lag may be neglected.'
	},
	{
		what: 'Shear from torsion, and its interaction with shear and bending (6.2.7)',
		why: 'Not built: no torque is taken.'
	},
	{
		what: 'Transverse forces on webs (EN 1993-1-5 6)',
		why: 'Not built: no local load is taken.'
	},
	{
		what: 'Fatigue (EN 1993-1-9), fire (EN 1993-1-2), cold-formed sections (EN 1993-1-3)',
		why: 'Not built.'
	},
	{
		what: 'National annexes',
		why: 'Recommended values stand; γ and η may be given with the request.'
	},
	{
		what: 'Groups of bolts and welds',
		why: 'Not built.'
	},
	{
		what: 'Printed columns: nominal weight, torsional shear constant C, bf/2tf and h/tw of American tables',
		why: 'Nominal weights are rounded to a name, and the others are figures that the engine does not report.'
	}
];

/** One rule that the engine follows without its text having been compared with the standard. */
export interface MemoryRule {
	readonly clause: string;
	readonly what: string;
	/** Sure of it, or to be checked before relying on it: answers that follow it say so. */
	readonly certainty: 'sure' | 'uncertain';
	/** What speaks for it here. */
	readonly held: string;
}

const examples = 'published examples and table values on this page';
const none = 'nothing but its own consistency';

/** No rule of EN 1993 was compared with a copy of the standard. */
export const rulesFromMemory: readonly MemoryRule[] = [
	{
		clause: 'EN 1993-1-1:2005 3.2.1',
		what: 'Nominal strengths, Table 3.1',
		certainty: 'sure',
		held: none
	},
	{
		clause: 'EN 1993-1-1:2005 5.5, 5.6',
		what: 'Classes, Table 5.2',
		certainty: 'sure',
		held: examples
	},
	{
		clause: 'EN 1993-1-1:2005 6.2.2.4',
		what: 'Class 3 web taken as an effective class 2',
		certainty: 'sure',
		held: 'CL03: that it applies; its moment by hand sums only'
	},
	{
		clause: 'EN 1993-1-1:2005 6.2.3 to 6.2.6',
		what: 'Tension, compression, bending and shear',
		certainty: 'sure',
		held: examples
	},
	{
		clause: 'EN 1993-1-1:2005 6.2.8 to 6.2.10',
		what: 'Bending with shear and axial force, about both axes',
		certainty: 'sure',
		held: 'one example each of an I and a tube; otherwise the exact block'
	},
	{
		clause: 'EN 1993-1-1:2005 6.3.2.2',
		what: 'Lateral–torsional buckling, general curves',
		certainty: 'sure',
		held: 'one published example'
	},
	{
		clause: 'EN 1993-1-5:2006 4.4',
		what: 'Effective widths, Tables 4.1 and 4.2',
		certainty: 'sure',
		held: 'one girder and the tabulated kσ of internal plates'
	},
	{
		clause: 'EN 1993-1-5:2006 5',
		what: 'Shear buckling of webs',
		certainty: 'sure',
		held: 'three published webs; the flange’s share Vbf by hand sums only'
	},
	{
		clause: 'EN 1993-1-5:2006 7.1, 8',
		what: 'Bending with shear buckling; flange-induced buckling',
		certainty: 'sure',
		held: 'hand sums only'
	},
	{
		clause: 'EN 1993-1-1:2022',
		what: 'The edition as a whole, with its clause numbers',
		certainty: 'uncertain',
		held: none
	},
	{
		clause: 'EN 1993-1-1:2022 Table 7.3, outstands',
		what: 'That the limits are those of 2005',
		certainty: 'uncertain',
		held: none
	},
	{
		clause: 'EN 1993-1-1:2022 Table 7.3, angles',
		what: 'That the row for compression is that of 2005',
		certainty: 'uncertain',
		held: none
	},
	{
		clause: 'EN 1993-1-1:2022 Table 7.3, round tubes',
		what: 'Class 3 by 2520ε²/(5ψ + 23), 140ε² in bending',
		certainty: 'uncertain',
		held: none
	},
	{
		clause: 'EN 1993-1-1:2022 Annex B',
		what: 'Interpolated class 3 modulus; with N or about both axes the linear sum',
		certainty: 'uncertain',
		held: none
	},
	{
		clause: 'EN 1993-1-1:2022 8.3.2',
		what: 'The general curves in place of those for doubly symmetric I sections',
		certainty: 'uncertain',
		held: none
	},
	{
		clause: 'ENV 1993-1-1:1992 5.4.6(2)(h)',
		what: 'Shear area of bars and free plates',
		certainty: 'uncertain',
		held: none
	},
	{
		clause: 'ECCS 33',
		what: 'Residual stress of rolling; of welding by common practice',
		certainty: 'uncertain',
		held: 'equilibrium alone'
	},
	{
		clause: 'EN 1993-1-4:2006 Annex C, EN 1999-1-1 Annex E',
		what: 'Rounded laws of stainless steel and aluminium',
		certainty: 'sure',
		held: 'closed forms on this page'
	}
];

/** A published example that is kept and not compared, or a figure of one that is. */
export interface ExampleGap extends Gap {
	readonly id: string;
	readonly clause: string;
}

/** Examples without an evaluator, then figures left out of those that have one, with the reason. */
export function examplesNotCovered(): ExampleGap[] {
	return workedExamples().flatMap(({ id, source, clause }) => {
		const work = exampleWorks[id];
		if (!work) return [{ id, what: source, clause, why: notCovered(id) ?? 'No reason is known.' }];
		return Object.entries(work.leftOut ?? {}).map(([name, why]) => ({
			...{ id, what: `${name} of ${source}`, clause, why }
		}));
	});
}
