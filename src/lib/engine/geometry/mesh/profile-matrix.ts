/**
 * Symmetric positive definite matrix kept row by row from its first entry to the diagonal, and its
 * solution by Cholesky's method, which fills nothing outside that profile.
 */
export class ProfileMatrix {
	private readonly first: Int32Array;
	/** Where a row's diagonal stands. */
	private readonly diagonal: Int32Array;
	private readonly values: Float64Array;

	/** `first` tells each row's first column. */
	constructor(first: Int32Array) {
		this.first = first;
		this.diagonal = new Int32Array(first.length);
		let at = -1;
		for (let i = 0; i < first.length; i++) this.diagonal[i] = at += i - first[i]! + 1;
		this.values = new Float64Array(at + 1);
	}

	/** Adds to the entry at (i, j) and its mirror. */
	add(i: number, j: number, value: number): void {
		const [row, column] = i > j ? [i, j] : [j, i];
		this.values[this.diagonal[row]! - row + column]! += value;
	}

	/** Takes the root of the matrix in its own place. */
	factorise(): void {
		const { first, diagonal, values } = this;
		for (let i = 0; i < first.length; i++) {
			const row = diagonal[i]! - i;
			for (let j = first[i]!; j <= i; j++) {
				const other = diagonal[j]! - j;
				let sum = values[row + j]!;
				for (let k = Math.max(first[i]!, first[j]!); k < j; k++)
					sum -= values[row + k]! * values[other + k]!;
				values[row + j] = j < i ? sum / values[other + j]! : Math.sqrt(sum);
			}
		}
	}

	/** Solution for one right-hand side, after `factorise`. */
	solved(right: Float64Array): Float64Array {
		const { first, diagonal, values } = this;
		const x = Float64Array.from(right);
		for (let i = 0; i < x.length; i++) {
			const row = diagonal[i]! - i;
			let sum = x[i]!;
			for (let k = first[i]!; k < i; k++) sum -= values[row + k]! * x[k]!;
			x[i] = sum / values[row + i]!;
		}
		for (let i = x.length - 1; i >= 0; i--) {
			const row = diagonal[i]! - i;
			const value = (x[i]! /= values[row + i]!);
			for (let k = first[i]!; k < i; k++) x[k]! -= values[row + k]! * value;
		}
		return x;
	}
}
