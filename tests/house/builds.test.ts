import { mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, describe, expect, it } from 'vitest';
import { isUsed, use } from '../../scripts/lib/build.js';

const place = mkdtempSync(path.join(tmpdir(), 'build-'));
afterEach(() => rmSync(path.join(place, '.users'), { recursive: true, force: true }));

describe('a build folder', () => {
	it('is in use while a process that took it lives', () => {
		expect(isUsed(place)).toBe(false);
		use(place);
		expect(isUsed(place)).toBe(true);
	});

	it('is free again when its users are gone, even if another process has got their number', () => {
		mkdirSync(path.join(place, '.users'));
		writeFileSync(path.join(place, '.users', '999999999'), '1');
		writeFileSync(path.join(place, '.users', String(process.pid)), 'born at another time');
		expect(isUsed(place)).toBe(false);
	});
});
