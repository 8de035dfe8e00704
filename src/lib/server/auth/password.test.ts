import { describe, expect, it } from 'vitest';
import { passwordFault, passwordFits, passwordHash } from './password';

describe('a password', () => {
	it('fits its own hash and no other', async () => {
		const stored = await passwordHash('fillet weld leg 8');
		expect(await passwordFits(stored, 'fillet weld leg 8')).toBe(true);
		expect(await passwordFits(stored, 'fillet weld leg 6')).toBe(false);
	});

	it('is kept as argon2id with its own salt', async () => {
		const [one, other] = await Promise.all([
			passwordHash('same words'),
			passwordHash('same words')
		]);
		expect(one).toMatch(/^\$argon2id\$/);
		expect(one).not.toBe(other);
	});

	it('never fits where nobody has one', async () => {
		expect(await passwordFits(null, 'anything at all')).toBe(false);
	});

	it('does not fit a hash that cannot be read', async () => {
		expect(await passwordFits('not a hash', 'anything at all')).toBe(false);
	});

	it('takes about as long for nobody as for somebody', async () => {
		const stored = await passwordHash('known');
		await passwordFits(null, 'warm up');
		const timeOf = async (against: string | null) => {
			const start = performance.now();
			await passwordFits(against, 'wrong');
			return performance.now() - start;
		};
		const times: { nobody: number[]; somebody: number[] } = { nobody: [], somebody: [] };
		for (let i = 0; i < 8; i++) {
			times.nobody.push(await timeOf(null));
			times.somebody.push(await timeOf(stored));
		}
		const ratio = Math.min(...times.nobody) / Math.min(...times.somebody);
		expect(ratio).toBeGreaterThan(0.5);
		expect(ratio).toBeLessThan(2);
	});

	it('is refused when shorter than ten or longer than two hundred characters', () => {
		expect(passwordFault('123456789')).toMatch(/at least 10/);
		expect(passwordFault('1234567890')).toBeNull();
		expect(passwordFault('x'.repeat(201))).toMatch(/at most 200/);
	});
});
