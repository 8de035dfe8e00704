import { describe, expect, it } from 'vitest';
import { defaultPreferences } from '$lib/units';
import { torsionRows } from './torsion-rows';

const gross = { centroid: { y: 10, z: 20 }, height: 200, width: 100 };

describe('torsion both ways', () => {
	it('shows the difference as a share of the handbook figure, and of places as a length', () => {
		const handbook = {
			torsionConstant: 100e4,
			warpingConstant: null,
			shearCentre: { y: 10, z: 50 }
		};
		const numerical = {
			torsionConstant: 102e4,
			warpingConstant: 5e9,
			shearCentre: { y: 10, z: 52 }
		};
		const rows = torsionRows(handbook, numerical, gross, defaultPreferences);
		const differences = rows.map(({ difference }) => difference.replaceAll('\u00a0', ' '));
		expect(differences).toEqual(['+2.0 %', '', '0 mm', '+2.0 mm']);
		expect(rows[1]?.handbook).toBe('–');
		expect(rows[3]).toMatchObject({ handbook: '30.00', numerical: '32.00', unit: 'mm' });
	});
});
