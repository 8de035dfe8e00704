const joined = /\b(top|bottom|left|right|vertical|horizontal)(Flange|Web|Leg)\b/g;

/** Words of a working with parts as people say them: "edge of top flange from the centroid". */
export const workingWords = (text: string): string =>
	text
		.replace(joined, (_, side: string, plate: string) => `${side} ${plate.toLowerCase()}`)
		.replace(/(flange|web|leg|wall)\.(\w+)/g, '$1, $2');
