/**
 * SHA-256 (FIPS 180-4) of a text in UTF-8, as 64 hexadecimal digits. Written out because the
 * browser's own is asynchronous, and the engine runs the same everywhere.
 */
export function sha256(text: string): string {
	const state = Uint32Array.from(firstPrimes(8), (prime) => fraction(Math.sqrt(prime)));
	const message = padded(new TextEncoder().encode(text));
	for (let offset = 0; offset < message.byteLength; offset += 64) absorb(state, message, offset);
	return [...state].map((word) => word.toString(16).padStart(8, '0')).join('');
}

/** The first 32 bits of the fraction of a number. */
const fraction = (value: number): number => Math.floor((value - Math.floor(value)) * 2 ** 32);

function firstPrimes(count: number): number[] {
	const primes: number[] = [];
	for (let n = 2; primes.length < count; n++)
		if (primes.every((prime) => n % prime !== 0)) primes.push(n);
	return primes;
}

const roundConstants = Uint32Array.from(firstPrimes(64), (prime) => fraction(Math.cbrt(prime)));

/** Message, a single 1 bit, zeros, and the length in bits: whole blocks of 64 bytes. */
function padded(bytes: Uint8Array): DataView {
	const blocks = Math.ceil((bytes.length + 9) / 64);
	const view = new DataView(new ArrayBuffer(blocks * 64));
	bytes.forEach((byte, i) => view.setUint8(i, byte));
	view.setUint8(bytes.length, 0x80);
	view.setUint32(blocks * 64 - 8, Math.floor(bytes.length / 2 ** 29));
	view.setUint32(blocks * 64 - 4, (bytes.length * 8) >>> 0);
	return view;
}

const turned = (word: number, by: number): number => (word >>> by) | (word << (32 - by));

function scheduleOf(message: DataView, offset: number): Uint32Array {
	const w = new Uint32Array(64);
	for (let i = 0; i < 16; i++) w[i] = message.getUint32(offset + 4 * i);
	for (let i = 16; i < 64; i++) {
		const [a, b] = [w[i - 15]!, w[i - 2]!];
		const s0 = turned(a, 7) ^ turned(a, 18) ^ (a >>> 3);
		const s1 = turned(b, 17) ^ turned(b, 19) ^ (b >>> 10);
		w[i] = w[i - 16]! + s0 + w[i - 7]! + s1;
	}
	return w;
}

function absorb(state: Uint32Array, message: DataView, offset: number): void {
	const w = scheduleOf(message, offset);
	let [a, b, c, d, e, f, g, h] = state as unknown as EightWords;
	for (let i = 0; i < 64; i++) {
		const s1 = turned(e, 6) ^ turned(e, 11) ^ turned(e, 25);
		const choice = (e & f) ^ (~e & g);
		const first = (h + s1 + choice + roundConstants[i]! + w[i]!) | 0;
		const s0 = turned(a, 2) ^ turned(a, 13) ^ turned(a, 22);
		const majority = (a & b) ^ (a & c) ^ (b & c);
		[h, g, f, e, d, c, b, a] = [g, f, e, (d + first) | 0, c, b, a, (first + s0 + majority) | 0];
	}
	[a, b, c, d, e, f, g, h].forEach((word, i) => (state[i] = state[i]! + word));
}

type EightWords = [number, number, number, number, number, number, number, number];
