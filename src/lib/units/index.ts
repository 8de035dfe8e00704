export {
	defaultPreferences,
	preferencesCookie,
	preferencesFrom,
	preferencesText,
	type Preferences
} from './preferences';
export { fromShown, quantities, quantityNoun, toShown, unitLabel, type Quantity } from './quantity';
export { parseQuantity, type ParsedQuantity } from './parse';
export {
	formatNumber,
	formatQuantity,
	NO_FIGURE,
	type NumberFormat,
	type QuantityFormat
} from './format';
