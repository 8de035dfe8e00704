/** The pure cases that a section is judged in, or a demand by its name. */
export type CaseName = string;

/** Keys of the figures that a working explains; one door for rules, screen and print. */
export const workingKey = {
	gross: (figure: string) => `gross.${figure}`,
	moment: (figure: string) => `moment.${figure}`,
	squashLoad: 'squashLoad',
	/** Limits of one part in one case: `class.plusMy.web.internal`. */
	limits: (name: CaseName, part: string, type: string) => `class.${name}.${part}.${type}`,
	/** Effective width of one element in one case. */
	effectiveWidth: (basis: string, part: string, element: string) =>
		`effective.${basis}.${part}.${element}`,
	/** A figure of the effective section: `effective.+My.area`. */
	effective: (basis: string, figure: string) => `effective.${basis}.${figure}`,
	resistance: (figure: string) => `resistance.${figure}`,
	/** A resistance under a demand's own forces: MyVRd, MyNRd, MbRd … */
	reduced: (demand: string, figure: string) => `reduced.${demand}.${figure}`,
	check: (demand: string, name: string) => `check.${demand}.${name}`
} as const;
