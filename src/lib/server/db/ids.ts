import { randomInt, randomUUID } from 'node:crypto';

let lastTime = 0;
let counter = 0;

/** Advances time or counter so that each pair is greater than the one before it. */
const tick = (now: number): void => {
	if (now > lastTime) {
		lastTime = now;
		counter = randomInt(0x800);
		return;
	}
	counter += 1;
	if (counter <= 0xfff) return;
	lastTime += 1;
	counter = 0;
};

/**
 * A new id for a row: a UUID of version 7 (RFC 9562, 5.7, method 1: a 12-bit counter after the
 * millisecond), so that text order is order of making. Each id of a process is greater than the
 * one before, also when the clock is set back.
 */
export const newId = (now: number = Date.now()): string => {
	tick(now);
	const time = lastTime.toString(16).padStart(12, '0');
	const count = (0x7000 | counter).toString(16);
	const variantAndRandom = randomUUID().slice(19);
	return `${time.slice(0, 8)}-${time.slice(8)}-${count}-${variantAndRandom}`;
};

const pattern = /^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/;

/** True for text made by `newId`. */
export const isId = (text: string): boolean => pattern.test(text);
