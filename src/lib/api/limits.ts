/** What one compute request may carry; every refusal names the limit it met. */
export const limits = {
	/** States, moments, curvatures or strain planes in one request. */
	states: 2000,
	/** States times edges of the section in one request. */
	work: 800_000,
	/** The same for states by moment, each of which is a search. */
	momentWork: 200_000,
	/** Plates of one section, and joins between them. */
	plates: 200,
	/** Points over all rings of an outline. */
	points: 2000,
	/** Points of one stress–strain curve. */
	curvePoints: 500,
	demands: 200,
	boltHoles: 200,
	/** Characters of a name. */
	name: 80,
	/** Bytes of a request body, 512 KiB. */
	body: 524_288,
	pageSize: 200
} as const;
