import { z } from 'zod';
import { codeSchema } from '$lib/api/code';
import { demandSchema } from '$lib/api/demand';
import { sectionSchema } from '$lib/api/section';
import { stiffenersSchema } from '$lib/api/stiffeners';
import { fail, ok, type Result } from '$lib/engine/result';
import { prepareSection } from '$lib/engine/section/prepare';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { allowedCode } from './allowed-code';
import { openingBend, type BendChoice, type Study } from './study';
import { mostTurns, type Turn } from './turns';

/** Name of the query parameter that carries an unsaved study. */
export const studyParameter = 'study';
/** First sign of the text; raised when its form changes. */
const addressVersion = '1';
/** Signs of a study that is read; an address carries fewer, the memory of a tab as many. */
const longest = 2_000_000;

/** Compact form: short keys, defaults left out. */
const addressSchema = z.object({
	n: z.string().max(120).optional(),
	s: sectionSchema,
	c: codeSchema.optional(),
	b: z.literal('code-table').optional(),
	d: z
		.array(demandSchema.extend({ name: z.string().max(120) }))
		.min(1)
		.max(60),
	f: stiffenersSchema.optional(),
	a: z.number().min(-360).max(360).optional(),
	t: z.literal('curvature-zero').optional(),
	k: z.number().min(-1000).max(1000).optional(),
	i: z.int().min(0).max(59).optional(),
	r: z.enum(['rolled', 'welded']).optional(),
	h: z
		.array(z.union([z.number().min(-1000).max(1000), z.literal('release')]))
		.max(mostTurns)
		.optional(),
	e: z.literal(1).optional(),
	q: z.number().min(-1e9).max(1e9).optional()
});

export interface Addressed {
	readonly study: Study;
	readonly bend: BendChoice;
	/** Code values that are no longer allowed and were changed on reading, in words. */
	readonly changes?: readonly string[];
}

/** An unsaved study as text for the address bar: version, then JSON in base64url. */
export function addressText({ study, bend }: Addressed): string {
	const compact: z.input<typeof addressSchema> = {
		...(study.shape ? { n: study.shape } : {}),
		s: study.section as z.input<typeof sectionSchema>,
		c: study.code,
		...(study.strengthBasis === 'code-table' ? { b: 'code-table' } : {}),
		d: [...study.demands],
		...(study.stiffeners ? { f: study.stiffeners } : {}),
		...(bend.axisAngle ? { a: bend.axisAngle } : {}),
		...(bend.transverse === 'curvature-zero' ? { t: 'curvature-zero' } : {}),
		k: Number(bend.ratio.toPrecision(6)),
		...(bend.activeCase === null ? {} : { i: bend.activeCase }),
		...(study.residual ? { r: study.residual } : {}),
		...(bend.turns?.length ? { h: bend.turns.map(shortTurn) } : {}),
		...(bend.atTurn ? { e: 1 } : {}),
		...(bend.typedN === undefined ? {} : { q: bend.typedN })
	};
	return addressVersion + '.' + toBase64Url(JSON.stringify(compact));
}

const shortTurn = (turn: Turn): Turn =>
	typeof turn === 'number' ? Number(turn.toPrecision(6)) : turn;

/** Reads `addressText` back; a sentence for the person when it cannot be used. */
export function addressedStudy(text: string): Result<Addressed, string> {
	if (text.length > longest) return fail('The study in this link is too long to be one of ours.');
	const [version, body = ''] = text.split('.', 2);
	if (version !== addressVersion)
		return fail('The study in this link was made by a version that is not understood here.');
	const { compact, changes } = withAllowedCode(jsonOf(body));
	const parsed = addressSchema.safeParse(compact);
	if (!parsed.success) return fail('The study in this link is damaged and could not be read.');
	const addressed = fromCompact(parsed.data);
	const prepared = prepareSection(addressed.study.section, addressed.study.strengthBasis);
	if (prepared.ok) return ok(changes.length > 0 ? { ...addressed, changes } : addressed);
	const why = prepared.error[0]?.message ?? '';
	return fail(`The section in this link cannot be built. ${why}`.trim());
}

/** Links outlive the values that a code choice may take: only its numbers are looked at here. */
const codeNumbers = z.looseObject({
	c: z.looseObject({
		gammaM0: z.number().optional(),
		gammaM1: z.number().optional(),
		gammaM2: z.number().optional(),
		eta: z.number().optional()
	})
});

function withAllowedCode(compact: unknown): { compact: unknown; changes: readonly string[] } {
	const read = codeNumbers.safeParse(compact);
	if (!read.success) return { compact, changes: [] };
	const { c, ...rest } = read.data;
	const { code, changes } = allowedCode(c as Study['code']);
	return { compact: { ...rest, c: code }, changes };
}

function fromCompact(compact: z.output<typeof addressSchema>): Addressed {
	return {
		study: {
			shape: compact.n ?? null,
			section: compact.s as SectionDefinition,
			code: compact.c ?? {},
			strengthBasis: compact.b ?? 'product-standard',
			demands: compact.d,
			...(compact.f ? { stiffeners: compact.f } : {}),
			...(compact.r ? { residual: compact.r } : {})
		},
		bend: {
			axisAngle: compact.a ?? 0,
			transverse: compact.t ?? 'moment-zero',
			ratio: compact.k ?? openingBend.ratio,
			activeCase: compact.i === undefined ? null : Math.min(compact.i, compact.d.length - 1),
			...(compact.h ? { turns: compact.h } : {}),
			...(compact.e ? { atTurn: true } : {}),
			...(compact.q === undefined ? {} : { typedN: compact.q })
		}
	};
}

function toBase64Url(text: string): string {
	const bytes = new TextEncoder().encode(text);
	const binary = Array.from(bytes, (byte) => String.fromCharCode(byte)).join('');
	return btoa(binary).replaceAll('+', '-').replaceAll('/', '_').replace(/=+$/, '');
}

function jsonOf(text: string): unknown {
	try {
		const binary = atob(text.replaceAll('-', '+').replaceAll('_', '/'));
		const bytes = Uint8Array.from(binary, (letter) => letter.charCodeAt(0));
		return JSON.parse(new TextDecoder().decode(bytes));
	} catch {
		return null;
	}
}
