import { describe, expect, it } from 'vitest';
import { schemaVersion } from '../version';
import { migratedDefinition } from './migrate';

const definition = { kind: 'flat', b: 10, h: 20, grade: 'S235' };

describe('a stored definition', () => {
	it("is given back as it is when it has today's form", () => {
		expect(migratedDefinition({ schemaVersion, definition })).toEqual({
			ok: true,
			value: definition
		});
	});

	it('is refused with a reason when it is newer than the program', () => {
		const result = migratedDefinition({ schemaVersion: schemaVersion + 1, definition });
		expect(result).toMatchObject({ ok: false });
		expect(!result.ok && result.error).toContain('newer program');
	});

	it('is refused when it is no definition or has no version', () => {
		expect(migratedDefinition({ schemaVersion, definition: null }).ok).toBe(false);
		expect(migratedDefinition({ schemaVersion, definition: { b: 1 } }).ok).toBe(false);
		expect(migratedDefinition({ schemaVersion: 0, definition }).ok).toBe(false);
	});
});
