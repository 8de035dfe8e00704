import type { Note } from '../../result';
import type { LimitedBy, ReducedFigures, Resistance, ResistanceCheck } from '../result';
import { addedMoments } from './shifted-centroid';
import { axialChecks } from './axial-checks';
import { clauseOf } from './edition';
import type { DemandCase } from './demand-case';
import { flangeChecks } from './flange-checks';
import { largestMoment } from './largest-moment';
import { memberChecks } from './member-checks';
import { isRule, type NormalRule } from './normal-rule';
import { normalRule } from './normal-rules';
import { explainCheck } from './check-workings';
import { gapNotes } from './gap-notes';
import { shearChecks, webConstraint } from './shear-checks';

/** A bound on the moment along the demand's direction, N and V held; kNm. */
export interface Constraint {
	readonly by: LimitedBy;
	readonly use: (moment: number) => number;
	/** Closed form of the greatest moment; null where it is looked for. */
	readonly most: number | null;
}

/** What a demand uses of the section, and what moment its rules would leave. */
export interface DemandChecks {
	readonly checks: ResistanceCheck[];
	readonly missing: Note[];
	readonly notes: Note[];
	/** Codes of the missing checks for which nothing is counted. */
	readonly withheld: string[];
	readonly reduced: ReducedFigures;
	/** kNm along the demand's direction, N and V held; null where nothing may be counted. */
	readonly countable: number | null;
	readonly basis: Resistance['basis'] | null;
	readonly limitedBy: LimitedBy | null;
	/** How N and moments were put together. */
	readonly together: NormalRule['kind'] | null;
	/** kN, a size, where N acts alone. */
	readonly countableForce: number | null;
}

/** All checks of one demand, with the moment and the force that they leave. */
export function demandChecks(c: DemandCase): DemandChecks {
	const rule = normalRule(c);
	const sheared = shearChecks(c);
	const member = memberChecks(c);
	const flange = flangeChecks(c, isRule(rule) ? rule.basis : null);
	const axial = axialChecks(c);
	const missing = [...gapNotes(c, isRule(rule) ? null : rule.gap), ...member.missing];
	const withheld = [...new Set(missing.map(({ code }) => code))];
	const normal = isRule(rule) ? normalChecks(c, rule) : [];
	const web = webConstraint(c);
	const constraints: Constraint[] = [
		...(isRule(rule) ? [{ by: 'section' as const, use: rule.use, most: rule.most }] : []),
		...(web ? [web.constraint] : []),
		...sheared.constraints,
		...member.constraints,
		...flange.constraints
	];
	const held = withheld.length > 0 || !isRule(rule);
	const onlyN = c.size === 0 && c.effects.N !== 0;
	const least = held || onlyN ? null : leastMoment(constraints, rule.most ?? c.size);
	return {
		checks: [
			...normal,
			...axial.checks,
			...sheared.checks,
			...(web?.checks ?? []),
			...member.checks,
			...flange.checks
		],
		missing,
		notes: [...(isRule(rule) ? ruleNotes(c, rule) : []), ...member.notes],
		withheld,
		reduced: {
			...(isRule(rule) ? rule.reduced : {}),
			...web?.reduced,
			...member.reduced
		},
		countable: least?.moment ?? null,
		basis: least === null || !isRule(rule) ? null : rule.basis,
		limitedBy: least?.by ?? null,
		together: isRule(rule) ? rule.kind : null,
		countableForce: held || !onlyN ? null : axial.countable
	};
}

/** The least of what the constraints leave, and which it is. */
function leastMoment(constraints: readonly Constraint[], guess: number) {
	let least: { moment: number; by: LimitedBy } | null = null;
	for (const { use, most, by } of constraints) {
		const moment = most ?? largestMoment(use, guess > 0 ? guess : 1);
		if (least === null || moment < least.moment) least = { moment, by };
	}
	return least;
}

function normalChecks(c: DemandCase, rule: NormalRule): ResistanceCheck[] {
	const { effects, size, context } = c;
	if (size === 0) {
		const axial = effects.N === 0 ? null : context.axial(effects.N, c.classified);
		const { addedY, addedZ } = addedMoments(context.model, effects.N, axial);
		if (addedY === 0 && addedZ === 0) return [];
	}
	const { standard } = context.model.code;
	const clause = `${clauseOf(standard, rule.topic)}${rule.also ? `, ${rule.also}` : ''}`;
	const check: ResistanceCheck = {
		demand: c.name,
		name: rule.name,
		clause,
		value: rule.value,
		limit: rule.limit,
		utilisation: rule.value / rule.limit
	};
	explainCheck(context.model, check, rule.working);
	return [check];
}

/** Where the code's curve lies above the exact block by more than this share, a note says so. */
const noticeable = 0.01;

function ruleNotes(c: DemandCase, rule: NormalRule): Note[] {
	const { standard } = c.context.model.code;
	const { MyNRd, MyNRdExact, MzNRd, MzNRdExact } = rule.reduced;
	const notes: Note[] = [];
	const over = Math.max(excess(MyNRd, MyNRdExact), excess(MzNRd, MzNRdExact));
	if (over > noticeable)
		notes.push({
			code: 'axial-bending-above-block',
			message: `Under ${c.name} the code’s moment beside N is ${(100 * over).toFixed(1)} % above the exact plastic block of the section. The check follows the code; both figures are given.`,
			clause: clauseOf(standard, 'axialBending')
		});
	if (rule.basis === 'interpolated')
		notes.push({
			code: 'rule-from-memory',
			message:
				'The interpolated class 3 modulus of Annex B is from memory: check it against the standard. A class 3 web is then not taken as class 2 as well: whether the edition lets both stand beside each other is not known.',
			clause: clauseOf(standard, 'interpolated')
		});
	if (rule.kind === 'sum' && rule.topic === 'linearSum')
		notes.push({
			code: 'linear-sum-only',
			message:
				'Axial force and moments that act together are added up linearly, which is on the safe side.',
			clause: clauseOf(standard, 'linearSum')
		});
	return notes;
}

const excess = (code = 0, exact = 0): number => (exact > 0 ? code / exact - 1 : 0);
