import type { CreateSectionRequest, SectionRecord } from '$lib/api/sections';
import { allowedCode, changesTold } from '../allowed-code';
import { openingStudy, type Study } from '../study';

/** What of a study is kept on the Rack. */
export function sectionToSave(
	study: Study
): Pick<CreateSectionRequest, 'definition' | 'settings' | 'standard'> {
	return {
		definition: study.section as CreateSectionRequest['definition'],
		standard: '',
		settings: {
			code: { ...study.code },
			strengthBasis: study.strengthBasis,
			demands: [...study.demands],
			...(study.stiffeners ? { stiffeners: study.stiffeners } : {}),
			...(study.residual ? { residual: study.residual } : {}),
			...(study.shape ? { shape: study.shape } : {})
		}
	};
}

/** The study of a saved section; what its settings leave out opens as on a fresh Bench. */
export function savedStudy({
	definition,
	settings
}: Pick<SectionRecord, 'definition' | 'settings'>): Study {
	const demands = (settings.demands ?? []).map((demand, index) => ({
		...demand,
		name: demand.name ?? `Case ${index + 1}`
	}));
	return {
		shape: typeof settings.shape === 'string' ? settings.shape : null,
		section: definition as Study['section'],
		code: { ...openingStudy.code, ...allowedCode((settings.code ?? {}) as Study['code']).code },
		strengthBasis: settings.strengthBasis ?? openingStudy.strengthBasis,
		demands: demands.length > 0 ? demands : [{ name: 'Case 1' }],
		...(settings.stiffeners ? { stiffeners: settings.stiffeners } : {}),
		...residualOf(settings.residual)
	};
}

const residualOf = (kept: unknown): Pick<Study, 'residual'> =>
	kept === 'rolled' || kept === 'welded' ? { residual: kept } : {};

/** What `savedStudy` changes of a section saved when other code values were allowed; or empty. */
export const savedChanges = ({ settings }: Pick<SectionRecord, 'settings'>): string =>
	changesTold(allowedCode((settings.code ?? {}) as Study['code']).changes);
