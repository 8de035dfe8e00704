import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { OutlineSection } from '$lib/engine/section/definition';
import { Bench as BenchOf } from '../bench.svelte';
import Bench from '../Bench.svelte';
import { openingAddressed } from '../opened-study';
import { buildKinds } from '../opening-sections';

function open() {
	const { study, bend } = openingAddressed;
	const section = buildKinds.find(({ key }) => key === 'outline')!.opening;
	const bench = new BenchOf({ study: { ...study, section }, bend });
	render(Bench, { bench });
	const outline = () => bench.definition as OutlineSection;
	return { bench, user: userEvent.setup(), outline };
}

const field = (name: string) => screen.getByLabelText(name);

async function paste(user: ReturnType<typeof userEvent.setup>, text: string) {
	await user.click(screen.getByText('Paste or upload coordinates'));
	await user.click(screen.getByLabelText(/^Coordinates in mm/));
	await user.paste(text);
	await user.click(screen.getByText('Use these coordinates'));
}

describe('the outline form', () => {
	it('changes a point as it is typed', async () => {
		const { user, outline } = open();
		await user.clear(field('z of point 3'));
		await user.type(field('z of point 3'), '95{Enter}');
		expect(outline().regions?.[0]?.outer[2]).toEqual([160, 95]);
	});

	it('takes pasted rings, one of them a hole', async () => {
		const { user, outline } = open();
		await paste(user, '0 0\n100 0\n100 200\n0 200\n\n30 50\n70 50\n70 150\n30 150');
		expect(outline().regions?.[0]?.holes).toHaveLength(1);
		expect(screen.getByText('8 points taken.')).toBeInTheDocument();
	});

	it('names every line that cannot be read', async () => {
		const { user } = open();
		await paste(user, '0 0\n100 zero\n100 200');
		expect(screen.getByText(/^Line 2 is not two numbers/)).toBeInTheDocument();
	});

	it('says where a ring crosses itself', async () => {
		const { bench, user } = open();
		await paste(user, '0 0\n100 100\n100 0\n0 100');
		expect(bench.issues[0]?.at).toEqual({ y: 50, z: 50 });
		expect(screen.getAllByText(/crosses itself near \(50, 50\)/).length).toBeGreaterThan(0);
	});

	it('says why there is no class and what would give one', () => {
		open();
		expect(screen.getByText(/no code gives it a class\. State the plates/)).toBeInTheDocument();
	});
});
