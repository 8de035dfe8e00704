import { axialWorks } from './axial';
import { classificationWorks } from './classification';
import { effectiveWorks } from './effective';
import { monosymmetricWorks } from './monosymmetric';
import { sectionPropertyWorks } from './section-properties';
import { shearWorks } from './shear';
import { textbookWorks } from './textbook';
import type { ExampleWorks } from './worked-example';

/** How each worked example of a rule that is built is worked, by the example's id. */
export const exampleWorks: ExampleWorks = {
	...sectionPropertyWorks,
	...classificationWorks,
	...effectiveWorks,
	...shearWorks,
	...axialWorks,
	...textbookWorks,
	...monosymmetricWorks
};

const aisc = 'AISC 360 is not built.';
const boltGroups = 'Groups of fasteners are not built.';

/** Why a worked example is not held against the engine, by the letters its id begins with. */
const reasons: Readonly<Record<string, string>> = {
	CL2: aisc,
	CL30: 'CSA S16 is not built.',
	CL31: 'IS 800 is not built.',
	AS: 'AS 4100 is not built.',
	EF07: aisc,
	EF08: aisc,
	SH06: aisc,
	SH10: aisc,
	AF: aisc,
	BI04: aisc,
	FG: boltGroups
};

/** Why no evaluator stands for an example; null where one does, undefined where nobody has said. */
export function notCovered(id: string): string | null | undefined {
	if (id in exampleWorks) return null;
	return Object.entries(reasons).find(([start]) => id.startsWith(start))?.[1];
}
