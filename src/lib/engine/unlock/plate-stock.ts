/** What a firm has at hand: proposals are made in these steps only. All mm. */
export interface PlateStock {
	/** Rising. */
	readonly thicknesses: readonly number[];
	/** Step of flange widths. */
	readonly widthStep: number;
	/** Step of web depths. */
	readonly depthStep: number;
	/** Step of the spacing between transverse stiffeners. */
	readonly stiffenerStep: number;
}
