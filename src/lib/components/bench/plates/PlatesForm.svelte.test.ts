import { render, screen, within } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { PlatesSection, SectionDefinition } from '$lib/engine/section/definition';
import { platePresets } from '$lib/engine/section/plates/presets';
import { Bench as BenchOf } from '../bench.svelte';
import Bench from '../Bench.svelte';
import { openingAddressed } from '../opened-study';

const covered = platePresets[0]!.section({}, 'S355');

function open(section: SectionDefinition = covered) {
	const { study, bend } = openingAddressed;
	const bench = new BenchOf({ study: { ...study, section }, bend });
	render(Bench, { bench });
	return {
		bench,
		user: userEvent.setup(),
		plates: () => (bench.definition as PlatesSection).plates
	};
}

// By label: roles of every choice of every grade would be worked out otherwise, which is slow.
const field = (name: string) => screen.getByLabelText(name);
const nameFields = () => screen.getAllByLabelText(/^Name of plate/);

describe('the plates form', () => {
	it('has one row a plate, and a typed size changes the section', async () => {
		const { user, plates } = open();
		expect(nameFields()).toHaveLength(5);
		await user.clear(field('Width, topCover'));
		await user.type(field('Width, topCover'), '180{Enter}');
		expect(plates()[0]).toMatchObject({ name: 'topCover', width: 180 });
	});

	it('steps a size by the arrow keys and goes down a column with Alt', async () => {
		const { user, plates } = open();
		field('Thickness, topCover').focus();
		await user.keyboard('{ArrowUp}');
		expect(plates()[0]!.thickness).toBeGreaterThan(12);
		await user.keyboard('{Alt>}{ArrowDown}{/Alt}');
		expect(field('Thickness, topFlange')).toHaveFocus();
	});

	it('selects the plate that is worked on', async () => {
		const { bench, user } = open();
		await user.click(field('Width, web'));
		expect(bench.pieces.plate).toBe('web');
	});

	it('offers the mend of a gap by its two plates and distance, and undo takes it back', async () => {
		const { bench, user, plates } = open();
		bench.reshape({
			...covered,
			plates: covered.plates.map((plate, at) => (at === 0 ? { ...plate, z: plate.z + 3.2 } : plate))
		});
		const list = await screen.findByLabelText('What keeps the plates from standing');
		expect(list).toHaveTextContent(/“topCover”.*gap is 3\.2 mm/);
		await user.click(within(list).getByRole('button', { name: /^Move .*3\.2 mm/ }));
		expect(bench.stale).toBe(false);
		bench.undo();
		expect(plates()[0]!.z).toBeCloseTo(covered.plates[0]!.z + 3.2, 9);
	});

	it('adds, duplicates and removes plates and keeps the keyboard with them', async () => {
		const { user, plates } = open();
		await user.click(screen.getByText('Add plate'));
		expect(plates()).toHaveLength(6);
		expect(field('Name of plate 6')).toHaveFocus();
		await user.click(field('Remove plate2'));
		expect(plates()).toHaveLength(5);
		expect(field('Name of plate 5')).toHaveFocus();
	});

	it('makes plates from a preset with its sizes', async () => {
		const { user, plates } = open();
		await user.click(screen.getByText('Begin from a preset'));
		await user.selectOptions(field('Preset'), 'Cruciform');
		await user.clear(field('Depth'));
		await user.type(field('Depth'), '400{Enter}');
		await user.click(screen.getByText('Make plates'));
		expect(plates().map(({ name }) => name)).toEqual(['upright', 'left', 'right']);
		expect(plates()[0]!.width).toBe(400);
	});

	it('gives a join a weld, and the joins are then as given', async () => {
		const { bench, user } = open();
		await user.click(screen.getByText(/^Joins/));
		const leg = field('Weld leg, topFlange – web');
		await user.clear(leg);
		await user.type(leg, '6{Enter}');
		expect((bench.definition as PlatesSection).joins).toContainEqual({
			a: 'topFlange',
			b: 'web',
			weldLeg: 6
		});
	});

	it('goes on from a welded I with free plates', async () => {
		const { bench, user } = open(openingAddressed.study.section);
		await user.click(screen.getByText('Turn into free plates'));
		expect(bench.definition.kind).toBe('plates');
	});
});
