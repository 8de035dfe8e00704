import { codeSchema } from './code';
import { must } from './describe';
import { listOf, strict, within } from './fields';
import { ranges } from './ranges';
import { z } from './zod';

const mostThicknesses = 60;

const rising = (values: readonly number[]) =>
	values.every((value, i) => i === 0 || value > values[i - 1]!);

const thicknesses = listOf(
	'Thicknesses',
	within('Plate thickness', 'mm', ranges.stockThickness),
	mostThicknesses
)
	.min(1, { error: 'The stock needs one thickness at least.' })
	.refine(rising, { error: 'Thicknesses must rise, each one once.' })
	.readonly();

const stepOf = (title: string) => within(title, 'mm', ranges.stockStep);

/** Plates that proposals may use. */
export const plateStockSchema = strict('A plate stock', {
	thicknesses,
	widthStep: stepOf('Step of widths'),
	depthStep: stepOf('Step of depths'),
	stiffenerStep: stepOf('Step of stiffener spacings')
}).meta({ id: 'PlateStock', description: 'Plates that proposals may use; mm.' });

/** PATCH /api/v1/firm: what changes, and the version that it was read at; null goes back to the default. */
export const firmSettingsRequest = strict('Settings of the firm', {
	version: z
		.number({ error: must('version', 'a whole number') })
		.int()
		.min(0),
	code: codeSchema.nullable().optional(),
	stock: plateStockSchema.nullable().optional()
}).meta({ id: 'FirmSettingsRequest' });
export type FirmSettingsRequest = z.infer<typeof firmSettingsRequest>;

/** What a firm has settled for all its studies; null where it keeps the program's defaults. */
export const firmSettingsSchema = z
	.object({
		/** 0 while nothing was settled. */
		version: z.number().int(),
		code: codeSchema.nullable(),
		stock: plateStockSchema.nullable(),
		updatedBy: z.string().nullable(),
		updatedAt: z.string().nullable()
	})
	.meta({ id: 'FirmSettings' });
export type FirmSettings = z.infer<typeof firmSettingsSchema>;

const envelope = z.object({ contract: z.literal(1), engineVersion: z.string() });

export const firmAnswerSchema = envelope
	.extend({
		firm: z.object({ id: z.string(), name: z.string() }),
		settings: firmSettingsSchema,
		/** The stock that proposals use where the firm keeps none. */
		defaultStock: plateStockSchema
	})
	.meta({ id: 'FirmAnswer' });
export type FirmAnswer = z.infer<typeof firmAnswerSchema>;

/** 409 `moved_on`: somebody saved in between; what was sent, and how it stands now. */
export const firmConflictSchema = z
	.object({
		error: z.object({ code: z.literal('moved_on'), message: z.string() }),
		yours: firmSettingsRequest,
		theirs: firmSettingsSchema
	})
	.meta({ id: 'FirmSettingsConflict' });

/** What a page knows of the firm in hand: its settings, and the stock that proposals use. */
export interface FirmInHand {
	/** Null for visitors and people without a firm: the program's defaults hold. */
	readonly firm: { readonly id: string; readonly name: string } | null;
	readonly settings: FirmSettings | null;
	readonly defaultStock: z.infer<typeof plateStockSchema>;
	readonly mayUpdate: boolean;
}

export const noFirm = (defaultStock: FirmInHand['defaultStock']): FirmInHand => ({
	firm: null,
	settings: null,
	defaultStock,
	mayUpdate: false
});
