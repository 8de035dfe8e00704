import { formatNumber, formatQuantity, type Preferences, type Quantity } from '$lib/units';

const quantities: Readonly<Record<string, Quantity>> = {
	mm: 'length',
	kN: 'force',
	kNm: 'moment',
	'N/mm²': 'stress'
};

/** A number with its unit, or a number with a fraction; not the numbers of clauses and editions. */
const figure =
	/(?<![\d.:\-\p{L}])(\d{1,3}(?:[ \u202f\u00a0]\d{3})+|\d+)(\.\d+)?(?![\d.]*\.\d)(?:[ \u00a0](N\/mm²|kNm|kN|mm)(?![\p{L}²³⁴⁶]))?/gu;

/** A note of the engine in the reader's units and decimal mark. */
export const noteText = (message: string, preferences: Preferences): string =>
	message.replace(figure, (found, whole: string, places = '', unit?: string) => {
		const value = Number(whole.replace(/\D/g, '') + places);
		const decimals = places === '' ? 0 : places.length - 1;
		if (unit === undefined)
			return places === '' ? found : formatNumber(value, preferences, { decimals });
		const quantity = quantities[unit];
		if (quantity === undefined) return found;
		return preferences.system === 'si'
			? formatQuantity(value, quantity, preferences, { decimals, unit: true })
			: formatQuantity(value, quantity, preferences, { digits: 4, trim: true, unit: true });
	});
