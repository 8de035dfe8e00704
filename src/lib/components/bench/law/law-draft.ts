import { materialOf } from '$lib/engine/material/grades';
import type {
	GradeDefinition,
	LawDefinition,
	Material,
	StrengthBasis
} from '$lib/engine/material/material';
import { fail, ok, type Result } from '$lib/engine/result';
import { curveOfText } from '$lib/engine/material/curve-text';

export type LawType = LawDefinition['type'];

/** A grade with its law while it is put together; N/mm², absent figures null. */
export interface LawDraft {
	readonly type: LawType;
	readonly fy: number;
	readonly fu: number | null;
	readonly E: number;
	/** Bilinear: slope beyond fy. */
	readonly Eh: number;
	/** Ramberg–Osgood exponents and ultimate strain; m and epsilonU follow from f0.2 and fu where null. */
	readonly n: number;
	readonly m: number | null;
	readonly epsilonU: number | null;
	readonly family: Family | null;
	/** The test curve as it was pasted. */
	readonly curve: string;
	readonly softening: boolean;
}

export type Family = 'austenitic' | 'duplex' | 'ferritic';

export const lawTitles: Readonly<Record<LawType, string>> = {
	'elastic-plastic': 'Elastic, then perfectly plastic',
	bilinear: 'Bilinear, hardening at Eh',
	'quad-linear': 'Quad-linear, hot-rolled steel',
	'ramberg-osgood': 'Rounded (Ramberg–Osgood)',
	curve: 'Test curve'
};

/** A few words for the list of grades. */
export const lawShort: Readonly<Record<LawType, string>> = {
	'elastic-plastic': 'elastic–plastic',
	bilinear: 'bilinear',
	'quad-linear': 'quad-linear',
	'ramberg-osgood': 'rounded',
	curve: 'test curve'
};

export const opening = {
	...{ Eh: 2100, n: 7, m: null, epsilonU: null, family: null, curve: '', softening: false }
} as const;

/** The draft that a grade stands for at a thickness, mm; null where the grade cannot be read. */
export function draftOf(
	grade: GradeDefinition,
	thickness: number,
	basis: StrengthBasis
): LawDraft | null {
	const material = materialOf(grade, thickness, basis);
	if (!material.ok) return null;
	const { fy, fu, E } = material.value;
	const law: LawDefinition =
		(typeof grade === 'object' ? grade.law : undefined) ?? ({ type: 'elastic-plastic' } as const);
	return { ...opening, fy, fu, E, type: law.type, ...fieldsOf(law) };
}

function fieldsOf(law: LawDefinition): Partial<LawDraft> {
	switch (law.type) {
		case 'bilinear':
			return { Eh: law.Eh };
		case 'ramberg-osgood':
			return {
				n: law.n,
				m: law.m ?? null,
				epsilonU: law.epsilonU ?? null,
				family: law.family ?? null
			};
		case 'curve':
			return {
				curve: law.tension.map((point) => point.join('; ')).join('\n'),
				softening: law.beyond === 'zero'
			};
		case 'elastic-plastic':
		case 'quad-linear':
			return {};
	}
}

export interface DraftedGrade {
	readonly grade: Exclude<GradeDefinition, string | number>;
	readonly material: Material;
}

/** The grade that a draft makes and what it gives; sentences where it makes none. */
export function gradeOfDraft(draft: LawDraft): Result<DraftedGrade, readonly string[]> {
	const law = lawOfDraft(draft);
	if (!law.ok) return law;
	const { fy, fu, E } = draft;
	const grade = { fy, ...(fu === null ? {} : { fu }), E, law: law.value };
	const material = materialOf(grade, 10, 'product-standard');
	return material.ok ? ok({ grade, material: material.value }) : fail([material.error]);
}

function lawOfDraft(draft: LawDraft): Result<LawDefinition, readonly string[]> {
	switch (draft.type) {
		case 'elastic-plastic':
		case 'quad-linear':
			return ok({ type: draft.type });
		case 'bilinear':
			return ok({ type: 'bilinear', Eh: draft.Eh });
		case 'ramberg-osgood': {
			const { n, m, epsilonU, family } = draft;
			return ok({
				...{ type: 'ramberg-osgood', n },
				...(m === null ? {} : { m }),
				...(epsilonU === null ? {} : { epsilonU }),
				...(family === null ? {} : { family })
			});
		}
		case 'curve': {
			const points = curveOfText(draft.curve, { softening: draft.softening });
			if (!points.ok) return fail(points.error.map(({ message }) => message));
			return ok({
				type: 'curve',
				tension: points.value,
				beyond: draft.softening ? 'zero' : 'flat'
			});
		}
	}
}

export interface LawPreset {
	readonly key: string;
	readonly title: string;
	readonly source: string;
	readonly values: Partial<LawDraft>;
}

const rounded = 'ramberg-osgood' as const;

/** Ready values to begin from; each says where it is from. */
export const lawPresets: readonly LawPreset[] = [
	{
		key: 'austenitic',
		title: 'Stainless, austenitic',
		source:
			'EN 1993-1-4: 1.4301 cold rolled, f0.2 230, fu 540, E 200 000; n 7 (later edition). From memory.',
		values: { type: rounded, fy: 230, fu: 540, E: 200_000, n: 7, family: 'austenitic' }
	},
	{
		key: 'duplex',
		title: 'Stainless, duplex',
		source:
			'EN 1993-1-4: 1.4462 cold rolled, f0.2 500, fu 700, E 200 000; n 8 (later edition). From memory.',
		values: { type: rounded, fy: 500, fu: 700, E: 200_000, n: 8, family: 'duplex' }
	},
	{
		key: 'ferritic',
		title: 'Stainless, ferritic',
		source:
			'EN 1993-1-4: 1.4016 cold rolled, f0.2 260, fu 450, E 200 000 (later edition); n 14. From memory.',
		values: { type: rounded, fy: 260, fu: 450, E: 200_000, n: 14, family: 'ferritic' }
	},
	{
		key: 'aluminium',
		title: 'Aluminium 6082-T6, extruded',
		source:
			'EN 1999-1-1 Table 3.2b: f0.2 250, fu 290, E 70 000, np 32, walls to 5 mm; one stage. From memory.',
		values: { type: rounded, fy: 250, fu: 290, E: 70_000, n: 32, family: null }
	}
];
