import type { Extent } from './turned-frame';

/** A vertical strip of the drawing, px. */
export interface Column {
	readonly x: number;
	readonly width: number;
	readonly middle: number;
}

/** A stretch of the section that is shown: what lies at `side` mm (left edge) is drawn at `x` px. */
export interface SectionWindow {
	readonly x: number;
	readonly width: number;
	readonly side: number;
}

/** Where everything of the section–strain–stress–couple drawing lies: px, one scale for depth. */
export interface BlockLayout {
	readonly width: number;
	readonly height: number;
	readonly narrow: boolean;
	readonly pxPerMm: number;
	readonly extent: Extent;
	/** Heights of the top and bottom fibre. */
	readonly top: number;
	readonly bottom: number;
	readonly section: Column;
	readonly strain: Column;
	readonly stress: Column;
	readonly couple: Column;
	/** Where the depth dimension and the labels of level lines stand. */
	readonly dimensionX: number;
	readonly gutterX: number;
	/** One window when the whole width fits; else left end, middle and right end, broken off between. */
	readonly windows: readonly SectionWindow[];
	/** The steel's left and right edge on the drawing. */
	readonly steel: { readonly left: number; readonly right: number };
}

const shares = {
	wide: { section: 0.455, strain: 0.15, stress: 0.245, couple: 0.15 },
	narrow: { section: 0.36, strain: 0.18, stress: 0.29, couple: 0.17 }
};
const room = {
	wide: { head: 58, above: 40, below: 46, dimension: 26, gutter: 86, side: 14 },
	narrow: { head: 44, above: 34, below: 40, dimension: 18, gutter: 44, side: 6 }
};
const breakGap = 12;
/** Depth on the drawing below which a section counts as very flat, px. */
const leastDepth = 44;
/** Room that is laid out even before the drawing has its size, so that nothing is turned inside out. */
const leastRoom = 40;

/** Lays the drawing out for a size in px and an extent in mm. */
export function blockLayout(width: number, height: number, extent: Extent): BlockLayout {
	const narrow = width < 560;
	const use = narrow ? room.narrow : room.wide;
	const columns = columnsOf(width, narrow ? shares.narrow : shares.wide);
	const steelLeft = use.dimension + use.gutter;
	const steelRoom = Math.max(leastRoom, columns.section.width - steelLeft - use.side);
	const depthRoom = Math.max(leastRoom, height - use.head - use.above - use.below);
	const scale = drawingScale(extent, steelRoom, depthRoom);
	const deep = (extent.top - extent.bottom) * scale;
	const top = use.head + use.above + (depthRoom - deep) / 2;
	const windows = windowsOf(extent, scale, steelLeft, steelRoom);
	const [first, last] = [windows[0], windows.at(-1)];
	return {
		width,
		height,
		narrow,
		pxPerMm: scale,
		extent,
		top,
		bottom: top + deep,
		...columns,
		dimensionX: use.dimension,
		gutterX: use.dimension + 6,
		windows,
		steel: { left: first?.x ?? 0, right: (last?.x ?? 0) + (last?.width ?? 0) }
	};
}

type Shares = Record<'section' | 'strain' | 'stress' | 'couple', number>;

function columnsOf(width: number, share: Shares): Record<keyof Shares, Column> {
	const strain = share.section;
	const stress = strain + share.strain;
	const couple = stress + share.stress;
	return {
		section: column(width, 0, share.section),
		strain: column(width, strain, share.strain),
		stress: column(width, stress, share.stress),
		couple: column(width, couple, share.couple)
	};
}

const column = (width: number, from: number, share: number): Column => ({
	x: width * from,
	width: width * share,
	middle: width * (from + share / 2)
});

/** Fits the whole section; a very flat one is drawn at least a readable depth and broken off sideways. */
function drawingScale(extent: Extent, widthRoom: number, depthRoom: number): number {
	const depth = extent.top - extent.bottom || 1;
	const width = extent.right - extent.left || 1;
	const fit = Math.min(depthRoom / depth, widthRoom / width);
	const readable = Math.min(150, depthRoom * 0.4);
	return fit * depth < leastDepth ? readable / depth : fit;
}

function windowsOf(extent: Extent, scale: number, left: number, space: number): SectionWindow[] {
	const wide = (extent.right - extent.left) * scale;
	if (wide <= space * 1.001)
		return [{ x: left + (space - wide) / 2, width: wide, side: extent.left }];
	const width = (space - 2 * breakGap) / 3;
	const shown = width / scale;
	const middle = Math.max(extent.left + shown, Math.min(extent.right - 2 * shown, -shown / 2));
	return [extent.left, middle, extent.right - shown].map((side, index) => ({
		x: left + index * (width + breakGap),
		width,
		side
	}));
}

/** Height on the drawing of a depth above the frame's origin, px. */
export const depthToPx = (layout: BlockLayout, depth: number) =>
	layout.top + (layout.extent.top - depth) * layout.pxPerMm;

/** Place on the drawing of a distance to the side, in the window that shows it; null when broken off. */
export function sideToPx(layout: BlockLayout, side: number): number | null {
	const slack = 1e-6 / layout.pxPerMm;
	const window = layout.windows.find(
		(one) => side >= one.side - slack && side <= one.side + one.width / layout.pxPerMm + slack
	);
	return window ? window.x + (side - window.side) * layout.pxPerMm : null;
}
