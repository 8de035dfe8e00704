import type { PlateStock } from '$lib/engine/unlock/plate-stock';
import { ranges } from '$lib/api/ranges';

/** Steps of a stock, mm. */
export type StockStep = 'widthStep' | 'depthStep' | 'stiffenerStep';

const same = (a: PlateStock, b: PlateStock) =>
	JSON.stringify(ordered(a)) === JSON.stringify(ordered(b));

const ordered = ({ thicknesses, widthStep, depthStep, stiffenerStep }: PlateStock): PlateStock => ({
	thicknesses,
	widthStep,
	depthStep,
	stiffenerStep
});

/** A stock while it is changed; sizes in mm. */
export class StockDraft {
	stock = $state.raw<PlateStock>() as PlateStock;

	constructor(stock: PlateStock) {
		this.stock = ordered(stock);
	}

	isLike(other: PlateStock): boolean {
		return same(this.stock, other);
	}

	/** Puts a thickness in its place; a sentence when it cannot be. */
	add(thickness: number): string | null {
		const { least, most } = ranges.stockThickness;
		const { thicknesses } = this.stock;
		if (thickness < least || thickness > most)
			return `Plates are ${least} to ${most} mm thick here.`;
		if (thicknesses.includes(thickness)) return 'This thickness is in the stock already.';
		if (thicknesses.length >= 60) return 'The stock holds 60 thicknesses at most. Take one out.';
		this.stock = {
			...this.stock,
			thicknesses: [...thicknesses, thickness].sort((a, b) => a - b)
		};
		return null;
	}

	remove(thickness: number): void {
		const thicknesses = this.stock.thicknesses.filter((one) => one !== thickness);
		if (thicknesses.length > 0) this.stock = { ...this.stock, thicknesses };
	}

	step(which: StockStep, value: number): void {
		this.stock = { ...this.stock, [which]: value };
	}
}
