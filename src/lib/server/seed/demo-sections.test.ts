import { describe, expect, it } from 'vitest';
import { createSectionRequest } from '../../api/sections';
import { passwordFault } from '../auth/password';
import { isInventedAddress } from '../mail/invented-address';
import { roles } from '../rights/roles';
import { sectionFacts } from '../sections/section-facts';
import { demoAccounts } from './demo-accounts';
import { demoSections } from './demo-sections';

describe('the demo firm', () => {
	it('has one person for each role, at addresses that belong to nobody', () => {
		expect(demoAccounts.people.map(({ role }) => role)).toEqual([...roles]);
		expect(demoAccounts.people.every(({ email }) => isInventedAddress(email))).toBe(true);
	});

	it('has a password that the sign-up would accept', () => {
		expect(passwordFault(demoAccounts.password)).toBeNull();
	});

	it('has sections in every state', () => {
		expect(new Set(demoSections.map(({ status }) => status))).toEqual(
			new Set(['draft', 'approved', 'withdrawn'])
		);
	});
});

describe.each(demoSections.map((demo) => [demo.section.name, demo.section] as const))(
	'the demo section %s',
	(_, request) => {
		it('is a valid request for a real section, and says that it is invented', () => {
			const { definition, settings, remark } = createSectionRequest.parse(request);
			expect(sectionFacts(definition, settings).ok).toBe(true);
			expect(remark).toMatch(/^Invented/);
		});
	}
);
