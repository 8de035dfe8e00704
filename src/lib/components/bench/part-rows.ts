import type { SectionDefinition } from '$lib/engine/section/definition';

/** One size of a section: where it stands in issues, and how it is read and changed. */
export interface SizeField {
	/** Path in the engine's issues (`tw`). */
	readonly path: string;
	readonly label: string;
	readonly value: number;
	readonly with: (value: number) => SectionDefinition;
}

/** A row of the parts form: a plate with its width, thickness and grade, or a single size. */
export interface PartRow {
	readonly title: string;
	/** Part names whose grade this row sets; empty for sizes that are no plate. */
	readonly parts: readonly string[];
	readonly width: SizeField | null;
	readonly thick: SizeField | null;
}

type Of<K extends SectionDefinition['kind']> = Extract<SectionDefinition, { kind: K }>;

/** The sizes of a section in the order a shop reads them; none for free plates and outlines. */
export function partRows(section: SectionDefinition): PartRow[] {
	switch (section.kind) {
		case 'i':
			return section.fabrication === 'welded' ? weldedIRows(section) : rolledIRows(section);
		case 'box':
			return boxRows(section);
		case 'channel':
			return channelRows(section);
		case 'tee':
			return teeRows(section);
		case 'angle':
			return sizes(
				section,
				['h', 'Vertical leg'],
				['b', 'Horizontal leg'],
				['t', 'Thickness'],
				['r', 'Root radius'],
				['rToe', 'Toe radius']
			);
		case 'rectangular-hollow':
			return sizes(
				section,
				['h', 'Depth'],
				['b', 'Width'],
				['t', 'Wall'],
				['ro', 'Outside corner'],
				['ri', 'Inside corner']
			);
		case 'circular-hollow':
			return sizes(section, ['d', 'Diameter'], ['t', 'Wall']);
		case 'flat':
			return sizes(section, ['h', 'Depth'], ['b', 'Width']);
		case 'round':
			return sizes(section, ['d', 'Diameter']);
		case 'plates':
		case 'outline':
			return [];
	}
}

/** A size that is a field of the definition as it stands; absent counts as 0. */
function size<D extends SectionDefinition>(
	section: D,
	path: keyof D & string,
	label: string
): SizeField {
	const held: unknown = section[path];
	return {
		path,
		label,
		value: typeof held === 'number' ? held : 0,
		with: (value) => ({ ...section, [path]: value })
	};
}

const single = (title: string, thick: SizeField): PartRow => ({
	title,
	parts: [],
	width: null,
	thick
});

const plate = (
	title: string,
	parts: readonly string[],
	width: SizeField,
	thick: SizeField
): PartRow => ({
	title,
	parts,
	width,
	thick
});

function sizes<D extends SectionDefinition>(
	section: D,
	...fields: readonly (readonly [keyof D & string, string])[]
): PartRow[] {
	return fields.map(([path, label]) => single(label, size(section, path, label)));
}

function weldedIRows(i: Of<'i'>): PartRow[] {
	const bottomThick = i.tfBottom ?? i.tf;
	const clear = i.h - i.tf - bottomThick;
	const bottom = { ...i, bBottom: i.bBottom ?? i.b, tfBottom: bottomThick };
	return [
		plate(
			'Top flange',
			['topFlange'],
			{
				...size(bottom, 'b', 'Top flange width')
			},
			{
				...size(i, 'tf', 'Top flange thickness'),
				with: (tf) => ({ ...bottom, tf, h: clear + tf + bottomThick })
			}
		),
		plate(
			'Web',
			['web'],
			{
				path: 'h',
				label: 'Web depth',
				value: clear,
				with: (hw) => ({ ...i, h: hw + i.tf + bottomThick })
			},
			size(i, 'tw', 'Web thickness')
		),
		plate('Bottom flange', ['bottomFlange'], size(bottom, 'bBottom', 'Bottom flange width'), {
			...size(bottom, 'tfBottom', 'Bottom flange thickness'),
			with: (tfBottom) => ({ ...bottom, tfBottom, h: clear + i.tf + tfBottom })
		}),
		single('Fillet weld leg', weldField(i))
	];
}

function weldField(section: Of<'i'> | Of<'tee'> | Of<'box'>): SizeField {
	const { weldThroat, ...rest } = section;
	return {
		path: weldThroat === undefined ? 'weldLeg' : 'weldThroat',
		label: 'Fillet weld leg',
		value: section.weldLeg ?? (weldThroat ?? 0) * Math.SQRT2,
		with: (weldLeg) => ({ ...rest, weldLeg })
	};
}

function rolledIRows(i: Of<'i'>): PartRow[] {
	const lopsided = i.bBottom !== undefined || i.tfBottom !== undefined;
	const whole = { ...i, bBottom: i.bBottom ?? i.b, tfBottom: i.tfBottom ?? i.tf };
	const flanges = lopsided
		? [
				plate(
					'Top flange',
					['topFlange'],
					size(i, 'b', 'Top flange width'),
					size(i, 'tf', 'Top flange thickness')
				),
				plate(
					'Bottom flange',
					['bottomFlange'],
					size(whole, 'bBottom', 'Bottom flange width'),
					size(whole, 'tfBottom', 'Bottom flange thickness')
				)
			]
		: [
				plate(
					'Flanges',
					['topFlange', 'bottomFlange'],
					size(i, 'b', 'Flange width'),
					size(i, 'tf', 'Flange thickness')
				)
			];
	return [
		single('Depth', size(i, 'h', 'Depth')),
		...flanges,
		{ title: 'Web', parts: ['web'], width: null, thick: size(i, 'tw', 'Web thickness') },
		single('Root radius', size(i, 'r', 'Root radius'))
	];
}

function boxRows(box: Of<'box'>): PartRow[] {
	const whole = { ...box, bBottom: box.bBottom ?? box.b };
	const clear = box.h - box.tfTop - box.tfBottom;
	return [
		plate('Top flange', ['topFlange'], size(whole, 'b', 'Top flange width'), {
			...size(box, 'tfTop', 'Top flange thickness'),
			with: (tfTop) => ({ ...whole, tfTop, h: clear + tfTop + box.tfBottom })
		}),
		plate(
			'Webs',
			['leftWeb', 'rightWeb'],
			{
				path: 'h',
				label: 'Web depth',
				value: clear,
				with: (hw) => ({ ...box, h: hw + box.tfTop + box.tfBottom })
			},
			size(box, 'tw', 'Web thickness')
		),
		plate('Bottom flange', ['bottomFlange'], size(whole, 'bBottom', 'Bottom flange width'), {
			...size(box, 'tfBottom', 'Bottom flange thickness'),
			with: (tfBottom) => ({ ...whole, tfBottom, h: clear + box.tfTop + tfBottom })
		}),
		single('Between webs', size(box, 'webGap', 'Clear between webs')),
		single('Fillet weld leg', weldField(box))
	];
}

function channelRows(channel: Of<'channel'>): PartRow[] {
	const slope = channel.flangeSlopePercent ?? 0;
	return [
		single('Depth', size(channel, 'h', 'Depth')),
		plate(
			'Flanges',
			['topFlange', 'bottomFlange'],
			size(channel, 'b', 'Flange width'),
			size(channel, 'tf', 'Flange thickness')
		),
		{ title: 'Web', parts: ['web'], width: null, thick: size(channel, 'tw', 'Web thickness') },
		single('Root radius', size(channel, 'r', 'Root radius')),
		...(slope > 0 || (channel.rToe ?? 0) > 0
			? [single('Toe radius', size(channel, 'rToe', 'Toe radius'))]
			: [])
	];
}

function teeRows(tee: Of<'tee'>): PartRow[] {
	return [
		single('Depth', size(tee, 'h', 'Depth')),
		plate(
			'Flange',
			['flange'],
			size(tee, 'b', 'Flange width'),
			size(tee, 'tf', 'Flange thickness')
		),
		{ title: 'Web', parts: ['web'], width: null, thick: size(tee, 'tw', 'Web thickness') },
		tee.fabrication === 'rolled'
			? single('Root radius', size(tee, 'r', 'Root radius'))
			: single('Fillet weld leg', weldField(tee))
	];
}
