/** What may be counted where the class, and with it the rule, changes with the size of the moment. */
export interface ByClass {
	/** Names the class of every part under a moment of that size, kNm; the same name, the same rule. */
	readonly nameAt: (moment: number) => string;
	/** Greatest moment that the class of that moment lets count, kNm; 0 for none. */
	readonly countedAt: (moment: number) => number;
}

/** Share of a moment that stands for just above nothing. */
const leastShare = 1e-9;
/** A bracket this narrow is a number; its lower end is taken. */
const narrow = 1e-9;
const rounding = 1e-12;
/** Looks between a moment and the one its class counts, closer together near the lower one. */
const looks = 5;
const mostClasses = 50;

/** A moment (kNm) and whether some smaller one fails. */
export interface CountedByClass {
	readonly moment: number;
	readonly failsBelow: boolean;
}

/**
 * The least moment beyond which the use exceeds 1, each moment judged by its own class. Where smaller
 * moments fail, but `own` itself passes, the least one from there upwards.
 */
export function countedByClass(byClass: ByClass, own: number): CountedByClass {
	const counted = byClass.countedAt(own);
	const size = Math.max(own, counted);
	if (!(size > 0)) return { moment: 0, failsBelow: false };
	const moment = firstFailing(byClass, leastShare * size);
	const passes = own <= counted * (1 + rounding);
	if (!passes || own <= moment * (1 + rounding)) return { moment, failsBelow: false };
	return { moment: firstFailing(byClass, own), failsBelow: true };
}

/** From a moment upwards, class by class; 0 where that moment itself fails. */
function firstFailing({ nameAt, countedAt }: ByClass, from: number): number {
	let at = from;
	let passed = 0;
	for (let i = 0; i < mostClasses; i++) {
		const most = countedAt(at);
		if (most < at * (1 - rounding)) return passed;
		const next = nextClass(nameAt, at, most);
		if (next === null) return most;
		[passed, at] = [next.below, next.above];
	}
	return passed;
}

/** Where the class first changes between two moments; null where it stays. */
function nextClass(nameAt: ByClass['nameAt'], from: number, to: number) {
	const name = nameAt(from);
	let [below, above] = [from, from];
	for (let i = 1; i <= looks && above === from; i++) {
		const look = from + (to - from) * (i / looks) ** 2;
		if (nameAt(look) === name) below = look;
		else above = look;
	}
	if (above === from) return null;
	while (above - below > narrow * above) {
		const middle = (below + above) / 2;
		if (middle <= below || middle >= above) break;
		if (nameAt(middle) === name) below = middle;
		else above = middle;
	}
	return { below, above };
}
