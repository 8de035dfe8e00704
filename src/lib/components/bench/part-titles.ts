const titles: Readonly<Record<string, string>> = {
	topFlange: 'Top flange',
	bottomFlange: 'Bottom flange',
	flange: 'Flange',
	web: 'Web',
	leftWeb: 'Left web',
	rightWeb: 'Right web',
	verticalLeg: 'Vertical leg',
	horizontalLeg: 'Horizontal leg',
	wall: 'Wall',
	bar: 'Bar'
};

/** A part's name as people say it; a plate's own name as it is. */
export const partTitle = (part: string): string => titles[part] ?? part;
