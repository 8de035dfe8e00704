import { expect, it } from 'vitest';
import { elementTitle } from './element-title';

it('names the side of an outstand, and only the part where an element is all of it', () => {
	expect(elementTitle('topFlange.left', 'topFlange')).toBe('Top flange, left');
	expect(elementTitle('web', 'web')).toBe('Web');
	expect(elementTitle('topFlange', 'topFlange')).toBe('Top flange');
});

it('keeps a plate’s own name, dots and all, and numbers its stretches', () => {
	expect(elementTitle('rib.2a', 'rib.2a')).toBe('rib.2a');
	expect(elementTitle('rib.2', 'rib')).toBe('rib, 2');
});
