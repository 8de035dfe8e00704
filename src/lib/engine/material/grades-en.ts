import { gradeTable, type GradeTable, type NamedGrade } from './grades-table';

const modulus = 210_000;
const codeSteps = [40, 80];
const steps = [16, 40, 63, 80, 100, 150];
const thermomechanicalSteps = [16, 40, 63, 80, 100, 120];
const quenchedSteps = [50, 100, 150];
const hollowSteps = [16, 40, 63, 80, 100, 120];
const fineGrainHollowSteps = [16, 40, 65];
const coldFormedSteps = [16, 40];

/** EN 1993-1-1:2005 Table 3.1, two bands (EN 10219-1 grades stop at 40 mm). */
const code = (fy: readonly number[], fu: readonly number[]) =>
	gradeTable('EN 1993-1-1 Table 3.1', codeSteps, fy, fu);

const product = (
	source: string,
	upTo: readonly number[],
	fy: readonly number[],
	fu: readonly number[]
) => gradeTable(source, upTo, fy, fu);

const grade = (
	name: string,
	codeTable: GradeTable | null,
	productStandard: GradeTable
): NamedGrade => ({ name, E: modulus, codeTable, productStandard });

/**
 * EN structural steels. Code table: EN 1993-1-1:2005 Table 3.1. Product standards: minimum ReH and
 * lowest Rm of EN 10025-2 (2019; S450 and S460 included), -3, -4, -6, EN 10210-1 and EN 10219-1.
 * All from memory of the tables; fu of S355 is 490 in the code and 470 in the product standard.
 */
export const enGrades: readonly NamedGrade[] = [
	grade(
		'S235',
		code([235, 215], [360, 360]),
		product('EN 10025-2', steps, [235, 225, 215, 215, 215, 195], [360, 360, 360, 360, 360, 350])
	),
	grade(
		'S275',
		code([275, 255], [430, 410]),
		product('EN 10025-2', steps, [275, 265, 255, 245, 235, 225], [410, 410, 410, 410, 410, 400])
	),
	grade(
		'S355',
		code([355, 335], [490, 470]),
		product('EN 10025-2', steps, [355, 345, 335, 325, 315, 295], [470, 470, 470, 470, 470, 450])
	),
	grade(
		'S450',
		code([440, 410], [550, 550]),
		product('EN 10025-2', steps, [450, 430, 410, 390, 380, 380], [550, 550, 550, 550, 550, 530])
	),
	grade(
		'S460',
		null,
		product('EN 10025-2', steps, [460, 440, 420, 400, 390, 390], [550, 550, 550, 550, 550, 530])
	),
	grade(
		'S275N',
		code([275, 255], [390, 370]),
		product('EN 10025-3', steps, [275, 265, 255, 245, 235, 225], [370, 370, 370, 370, 370, 350])
	),
	grade(
		'S355N',
		code([355, 335], [490, 470]),
		product('EN 10025-3', steps, [355, 345, 335, 325, 315, 295], [470, 470, 470, 470, 470, 450])
	),
	grade(
		'S420N',
		code([420, 390], [520, 520]),
		product('EN 10025-3', steps, [420, 400, 390, 370, 360, 340], [520, 520, 520, 520, 520, 500])
	),
	grade(
		'S460N',
		code([460, 430], [540, 540]),
		product('EN 10025-3', steps, [460, 440, 430, 410, 400, 380], [540, 540, 540, 540, 540, 530])
	),
	grade(
		'S275M',
		code([275, 255], [370, 360]),
		product(
			'EN 10025-4',
			thermomechanicalSteps,
			[275, 265, 255, 245, 245, 240],
			[370, 370, 360, 350, 350, 350]
		)
	),
	grade(
		'S355M',
		code([355, 335], [470, 450]),
		product(
			'EN 10025-4',
			thermomechanicalSteps,
			[355, 345, 335, 325, 325, 320],
			[470, 470, 450, 440, 440, 430]
		)
	),
	grade(
		'S420M',
		code([420, 390], [520, 500]),
		product(
			'EN 10025-4',
			thermomechanicalSteps,
			[420, 400, 390, 380, 370, 365],
			[520, 520, 500, 480, 470, 460]
		)
	),
	grade(
		'S460M',
		code([460, 430], [540, 530]),
		product(
			'EN 10025-4',
			thermomechanicalSteps,
			[460, 440, 430, 410, 400, 385],
			[540, 540, 530, 510, 500, 490]
		)
	),
	grade(
		'S460Q',
		code([460, 440], [570, 550]),
		product('EN 10025-6', quenchedSteps, [460, 440, 400], [550, 550, 500])
	),
	grade('S690Q', null, product('EN 10025-6', quenchedSteps, [690, 650, 630], [770, 760, 710])),
	grade(
		'S235H',
		code([235, 215], [360, 340]),
		product(
			'EN 10210-1',
			hollowSteps,
			[235, 225, 215, 215, 215, 195],
			[360, 360, 360, 360, 360, 350]
		)
	),
	grade(
		'S275H',
		code([275, 255], [430, 410]),
		product(
			'EN 10210-1',
			hollowSteps,
			[275, 265, 255, 245, 235, 225],
			[410, 410, 410, 410, 410, 400]
		)
	),
	grade(
		'S355H',
		code([355, 335], [510, 490]),
		product(
			'EN 10210-1',
			hollowSteps,
			[355, 345, 335, 325, 315, 295],
			[470, 470, 470, 470, 470, 450]
		)
	),
	grade(
		'S420NH',
		code([420, 390], [540, 520]),
		product('EN 10210-1', fineGrainHollowSteps, [420, 400, 390], [520, 520, 520])
	),
	grade(
		'S460NH',
		code([460, 430], [560, 550]),
		product('EN 10210-1', fineGrainHollowSteps, [460, 440, 430], [540, 540, 540])
	),
	grade(
		'S460MH',
		gradeTable('EN 1993-1-1 Table 3.1', [40], [460], [530]),
		product('EN 10219-1', coldFormedSteps, [460, 440], [530, 530])
	)
];
