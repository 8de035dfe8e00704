import type { SectionSettings } from '../../api/sections';
import { fail, ok, type Result } from '../../engine/result';
import { inputHash } from '../../engine/section/canonical';
import type { SectionDefinition, SectionKind } from '../../engine/section/definition';
import { prepareSection } from '../../engine/section/prepare';
import { engineVersion, schemaVersion } from '../../engine/version';
import type { Refusal } from '../http/refusal';

/** What the server itself finds out about a section that is to be kept. mm, mm², kg/m. */
export interface SectionFacts {
	kind: SectionKind;
	definition: SectionDefinition;
	schemaVersion: number;
	settings: SectionSettings;
	inputHash: string;
	area: number;
	mass: number;
	h: number;
	b: number;
}

/** Turns the section into steel and takes its figures; a section that is none is refused. */
export const sectionFacts = (
	definition: SectionDefinition,
	settings: SectionSettings
): Result<SectionFacts, Refusal> => {
	const basis = settings.strengthBasis ?? settings.code?.strengthBasis;
	const prepared = prepareSection(definition, basis);
	if (!prepared.ok) {
		const issues = prepared.error.map(({ path, message }) => ({
			path: path ? `definition.${path}` : 'definition',
			message
		}));
		const message = issues[0]?.message ?? 'The section is not valid.';
		return fail({ status: 400, code: 'invalid_section', message, issues });
	}
	const { area, mass, height, width } = prepared.value.gross;
	const hash = inputHash({ engineVersion, schemaVersion, definition, settings });
	const figures = { area, mass, h: height, b: width };
	const kept = { kind: definition.kind, definition, schemaVersion, settings };
	return ok({ ...kept, inputHash: hash, ...figures });
};
