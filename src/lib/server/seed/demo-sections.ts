import type { CreateSectionRequest, SectionState } from '../../api/sections';
import type { Role } from '../rights/roles';

const invented = 'Invented for the demo.';
const project = 'Mallow Dock market hall';
const code = { standard: 'EN1993-1-1:2005' } as const;

/** A saved section of the demo firm: what, by whom, and where it stands. */
export interface DemoSection {
	section: CreateSectionRequest;
	by: Role;
	status: SectionState;
}

/** In the order of the list, newest first. All invented; one is deliberately odd. Lengths mm, kN, kNm. */
export const demoSections: readonly DemoSection[] = [
	{
		by: 'designer',
		status: 'approved',
		section: {
			name: 'Transfer girder G2',
			project,
			remark: `${invented} Carries the gallery over the loading bay.`,
			definition: {
				kind: 'i',
				fabrication: 'welded',
				h: 940,
				b: 400,
				tf: 20,
				tw: 14,
				weldLeg: 8,
				grade: 'S355'
			},
			settings: { code, demands: [{ name: 'Gallery full', My: 2400, Vz: 610 }] }
		}
	},
	{
		by: 'designer',
		status: 'draft',
		section: {
			name: 'Roof purlin P1',
			project,
			remark: invented,
			definition: {
				kind: 'channel',
				h: 200,
				b: 75,
				tw: 6,
				tf: 11,
				r: 12,
				grade: 'S275'
			},
			settings: { code, demands: [{ name: 'Snow', My: 22, Vz: 18 }] }
		}
	},
	{
		by: 'librarian',
		status: 'approved',
		section: {
			name: 'Hall column C4',
			project,
			remark: invented,
			definition: {
				kind: 'rectangular-hollow',
				h: 300,
				b: 300,
				t: 12.5,
				ro: 18.75,
				ri: 12.5,
				fabrication: 'hot-finished',
				grade: 'S355'
			},
			settings: { code, demands: [{ name: 'Wind on gable', N: -1250, My: 145, Vz: 40 }] }
		}
	},
	{
		by: 'designer',
		status: 'draft',
		section: {
			name: 'Crane girder K1, hybrid',
			project,
			remark: `${invented} Flanges S460 on an S355 web.`,
			definition: {
				kind: 'i',
				fabrication: 'welded',
				h: 790,
				b: 360,
				tf: 25,
				bBottom: 280,
				tfBottom: 20,
				tw: 12,
				weldLeg: 6,
				grade: 'S355',
				partGrades: { topFlange: 'S460', bottomFlange: 'S460' }
			},
			settings: { code, demands: [{ name: 'Hoist at mid-span', My: 1680, Vz: 420 }] }
		}
	},
	{
		by: 'designer',
		status: 'draft',
		section: {
			name: 'Edge angle E7',
			project,
			remark: invented,
			definition: { kind: 'angle', h: 150, b: 75, t: 10, r: 12, rToe: 6, grade: 'S275' },
			settings: { code }
		}
	},
	{
		by: 'librarian',
		status: 'withdrawn',
		section: {
			name: 'Footbridge box B1',
			project,
			remark: `${invented} Withdrawn: replaced by a deeper one.`,
			definition: {
				kind: 'box',
				h: 640,
				b: 520,
				tw: 10,
				tfTop: 16,
				tfBottom: 16,
				webGap: 440,
				weldLeg: 5,
				grade: 'S355'
			},
			settings: { code, demands: [{ name: 'Crowd', My: 780, Vz: 210 }] }
		}
	},
	{
		by: 'designer',
		status: 'draft',
		section: {
			name: 'Transfer girder G3 (look again)',
			project,
			remark: `${invented} Odd on purpose: the web was typed as 4 mm instead of 14.`,
			definition: {
				kind: 'i',
				fabrication: 'welded',
				h: 940,
				b: 400,
				tf: 20,
				tw: 4,
				weldLeg: 8,
				grade: 'S355'
			},
			settings: { code, demands: [{ name: 'Gallery full', My: 2400, Vz: 610 }] }
		}
	}
];
