/** Something that has to be told about opening or saving, and what can be done about it. */
export interface BenchNotice {
	readonly kind: 'info' | 'warn' | 'error';
	readonly title: string;
	readonly text: string;
	readonly act?: { readonly name: string; readonly run: () => void };
	readonly away?: () => void;
}
