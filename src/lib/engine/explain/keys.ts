/** The pure cases that a section is judged in, or a demand by its name. */
export type CaseName = string;

/** Keys of the figures that a working explains; one door for rules, screen and print. */
export const workingKey = {
	gross: (figure: string) => `gross.${figure}`,
	moment: (figure: string) => `moment.${figure}`,
	squashLoad: 'squashLoad',
	/** Every part at its own strength in tension. */
	yieldLoad: 'yieldLoad',
	/** Limits of one part in one case: `class.plusMy.web.internal`. */
	limits: (name: CaseName, part: string, type: string) => `class.${name}.${part}.${type}`,
	/** What they come from: `class.plusMy.web.internal.alpha`; the limits alone are `.1`, `.2`, `.3`. */
	limitFigure: (name: CaseName, part: string, type: string, figure: string) =>
		`class.${name}.${part}.${type}.${figure}`,
	/** Effective width of one element in one case. */
	effectiveWidth: (basis: string, part: string, element: string) =>
		`effective.${basis}.${part}.${element}`,
	/** What it comes from: `effective.+My.web.web.rho`. */
	effectiveWidthFigure: (basis: string, part: string, element: string, figure: string) =>
		`effective.${basis}.${part}.${element}.${figure}`,
	/** A figure of the effective section: `effective.+My.area`. */
	effective: (basis: string, figure: string) => `effective.${basis}.${figure}`,
	/** A figure of the shear along an axis: `shear.z.area`, `shear.z.web.chi`. */
	shear: (axis: 'y' | 'z', figure: string) => `shear.${axis}.${figure}`,
	resistance: (figure: string) => `resistance.${figure}`,
	/** A resistance under a demand's own forces: MyVRd, MyNRd, MbRd … */
	reduced: (demand: string, figure: string) => `reduced.${demand}.${figure}`,
	check: (demand: string, name: string) => `check.${demand}.${name}`,
	/** What a demand shows on the ruler of its own moment: countable, firstYield, fullPlastic, use … */
	demand: (demand: string, figure: string) => `demand.${demand}.${figure}`,
	/** Places from the bottom, the left or the centroid: `place.plasticAxis.z`. */
	place: (figure: string) => `place.${figure}`
} as const;
