import { expect, it } from 'vitest';
import { sectionIdentity } from './section-identity';

it('capitals, spaces and the multiplication sign do not make another section', () => {
	expect(sectionIdentity('PG 900×400 ', 'Yard')).toBe(sectionIdentity('pg  900x400', 'yard'));
});

it('another standard or another name does', () => {
	expect(sectionIdentity('G1', 'A')).not.toBe(sectionIdentity('G1', 'B'));
	expect(sectionIdentity('G1', 'A')).not.toBe(sectionIdentity('G2', 'A'));
	expect(sectionIdentity('Träger', '')).not.toBe(sectionIdentity('Trager', ''));
});
