import { describe, expect, it } from 'vitest';
import type { PlatesSection } from '../section/definition';
import { platesVariables } from './plates-variables';

const stock = { thicknesses: [10, 12, 16], widthStep: 50, depthStep: 50, stiffenerStep: 250 };

/** A tee with its flange held in the middle, and a lip on the left end of the flange. */
const lipped: PlatesSection = {
	kind: 'plates',
	grade: 'S355',
	plates: [
		{ name: 'flange', width: 300, thickness: 12, y: 150, z: 206, angle: 0 },
		{ name: 'web', width: 200, thickness: 12, y: 150, z: 100, angle: 90 },
		{ name: 'lip', width: 60, thickness: 12, y: 6, z: 170, angle: 90 }
	]
};

const changed = (part: string, field: string, to: number) => {
	const found = platesVariables(lipped, stock).find(
		(one) => one.part === part && one.field === field
	);
	const girder = found?.changed({ definition: lipped, stiffeners: null }, to);
	const definition = girder?.definition as PlatesSection | undefined;
	return definition?.plates.find(({ name }) => name === part);
};

describe('what may be changed of free plates', () => {
	it('moves a plate’s middle so that only its free side moves', () => {
		// the flange is held by lip and web: its right tip is free, the left edge stays at 0
		expect(changed('flange', 'width', 250)).toMatchObject({ width: 250, y: 125, z: 206 });
		// the web stands under the flange: its lower tip is free, the upper edge stays at 200
		expect(changed('web', 'width', 150)).toMatchObject({ width: 150, y: 150, z: 125 });
	});

	it('thickens a plate about its middle', () => {
		expect(changed('web', 'thickness', 16)).toMatchObject({ thickness: 16, y: 150, z: 100 });
	});
});
