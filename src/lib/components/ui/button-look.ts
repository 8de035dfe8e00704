/** `primary` for the one thing to do here, `plain` beside it, `spark` on the bar, `quiet` in rows. */
export type ButtonLook = 'primary' | 'plain' | 'spark' | 'quiet' | 'danger' | 'onBar';

const shape =
	'inline-flex items-center justify-center gap-2 rounded border font-semibold whitespace-nowrap cursor-pointer select-none no-underline disabled:cursor-not-allowed disabled:opacity-50 aria-disabled:cursor-not-allowed aria-disabled:opacity-50';

const looks: Record<ButtonLook, string> = {
	primary: 'border-button bg-button text-on-layout hover:bg-layout-2 hover:border-layout-2',
	plain: 'border-line-button bg-sheet text-line-button hover:bg-vellum',
	spark: 'border-spark bg-spark text-on-spark hover:brightness-95',
	quiet: 'border-transparent bg-transparent text-link hover:bg-grid',
	danger: 'border-bad bg-sheet text-bad hover:bg-vellum',
	onBar: 'border-on-layout/80 bg-transparent text-on-layout hover:bg-on-layout/15'
};

const sizes = { normal: 'min-h-8 px-3 text-sm', small: 'min-h-7 px-2.5 text-[13px]' };

export const buttonClass = (look: ButtonLook, size: keyof typeof sizes = 'normal'): string =>
	`${shape} ${looks[look]} ${sizes[size]}`;
