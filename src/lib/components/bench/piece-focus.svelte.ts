/** What of a section's pieces the form and the drawing point at together. */
export class PieceFocus {
	/** Name of the plate that is selected. */
	plate = $state<string | null>(null);
	/** The clear widths of all plates are drawn, not only those of the selected one. */
	stretches = $state(false);
	/** Point of an outline that is being edited, mm. */
	point = $state<readonly [number, number] | null>(null);
}
