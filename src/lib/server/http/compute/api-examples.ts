import type { Result } from '../../../engine/result';
import { shapeDefinition } from '../../queries/shapes';
import type { Refusal } from '../refusal';
import { analyseAnswer } from './analyse-answer';
import { exampleSections } from './example-sections';
import { responseAnswer } from './response-answer';

/** A request as it is sent, and what the engine answers to it now. */
export interface ApiExample {
	operation: string;
	title: string;
	path: string;
	request: object;
	status: number;
	answer: object;
}

type Compute = typeof analyseAnswer | typeof responseAnswer;

const bodyOf = (result: Result<object, Refusal>): Pick<ApiExample, 'status' | 'answer'> => {
	if (result.ok) return { status: 200, answer: result.value };
	const { status, code, message, issues } = result.error;
	return { status, answer: { error: { code, message, issues } } };
};

const example = async (
	operation: string,
	title: string,
	compute: Compute,
	request: object
): Promise<ApiExample> => ({
	...{ operation, title, request, path: `/api/v1/${operation}` },
	...bodyOf(await compute(request, shapeDefinition))
});

const girder = { ...exampleSections.i, partGrades: { topFlange: 'S460N', bottomFlange: 'S460N' } };

/** Examples for the page that explains the API, computed by the engine at this moment. */
export const apiExamples = (): Promise<ApiExample[]> =>
	Promise.all([
		example('analyse', 'A hybrid plate girder under moment and shear', analyseAnswer, {
			section: girder,
			code: { standard: 'EN1993-1-1:2005', gammaM0: 1 },
			demands: [{ name: 'Span', My: 1800, Vz: 250 }]
		}),
		example('analyse', 'A misspelt dimension', analyseAnswer, {
			section: { ...exampleSections.flat, hh: 100, b: '20' }
		}),
		example('response', 'A bar bent to twice its curvature at first yield', responseAnswer, {
			section: exampleSections.flat,
			at: { curvatureRatio: [1, 2] }
		})
	]);
