import { line, scaleLinear } from 'd3';
import type { InteractionPlane } from '$lib/engine/response/interaction';
import { toShown, unitLabel, type Preferences } from '$lib/units';
import {
	forceQuantity,
	planeForces,
	readable,
	stretches,
	type Force,
	type ReadPoint,
	type Series
} from './interaction-model';

const forces: readonly Force[] = ['N', 'My', 'Mz'];

/** All points as CSV in the shown units; a comma for the decimals parts the cells by semicolons. */
export function interactionCsv(series: readonly Series[], preferences: Preferences): string {
	const comma = preferences.decimal === 'comma';
	const part = comma ? ';' : ',';
	const special = [part, '"', '\n', '\r'];
	const cell = (text: string) =>
		special.some((sign) => text.includes(sign)) ? `"${text.replaceAll('"', '""')}"` : text;
	const number = (value: number, force: Force) => {
		const shown = Number(toShown(value, forceQuantity(force), preferences.system).toPrecision(9));
		return comma ? String(shown).replace('.', ',') : String(shown);
	};
	const head = [
		'curve',
		'case',
		...forces.map((force) => `${force} (${unitLabel(forceQuantity(force), preferences)})`)
	];
	const rows = series.flatMap((one) =>
		readable(one).map((point) => [
			one.title,
			point.name ?? '',
			...forces.map((force) => number(point[force], force))
		])
	);
	return [head, ...rows].map((row) => row.map(cell).join(part)).join('\r\n') + '\r\n';
}

const looks: Readonly<Record<Series['key'], string>> = {
	plastic: 'stroke="#e58a00" stroke-width="2.25"',
	'first-yield': 'stroke="#1c2230" stroke-width="1.75" stroke-dasharray="1.5 3"',
	code: 'stroke="#2c3f8f" stroke-width="2" stroke-dasharray="10 3"',
	cases: ''
};
const size = { width: 800, height: 600, margin: 56 };

/** The chart as a picture that stands by itself, in the shown units. */
export function interactionSvg(
	series: readonly Series[],
	plane: InteractionPlane,
	title: string,
	preferences: Preferences
): string {
	const [across, up] = planeForces[plane];
	const value = (point: ReadPoint, force: Force) =>
		toShown(point[force], forceQuantity(force), preferences.system);
	const all = series.flatMap(readable);
	const scale = (force: Force, from: number, to: number) => {
		const values = [0, ...all.map((point) => value(point, force))];
		return scaleLinear([Math.min(...values), Math.max(...values)], [from, to]).nice();
	};
	const { width, height, margin } = size;
	const x = scale(across, margin, width - margin);
	const y = scale(up, height - margin, margin);
	const path = line<ReadPoint>(
		(point) => x(value(point, across)),
		(point) => y(value(point, up))
	);
	const curves = series.flatMap((one) =>
		one.key === 'cases'
			? readable(one).map(
					(point) =>
						`<circle cx="${x(value(point, across))}" cy="${y(value(point, up))}" r="4.5" fill="${point.offPlane ? '#fff' : '#2c3f8f'}" stroke="#2c3f8f"/><text x="${x(value(point, across)) + 8}" y="${y(value(point, up)) + 4}">${escaped(point.name ?? '')}</text>`
				)
			: stretches(one).map((own) => `<path d="${path(own)}" fill="none" ${looks[one.key]}/>`)
	);
	const ticks = [
		...x
			.ticks(7)
			.map((tick) => `<text x="${x(tick)}" y="${height - 34}" text-anchor="middle">${tick}</text>`),
		...y.ticks(7).map((tick) => `<text x="48" y="${y(tick) + 4}" text-anchor="end">${tick}</text>`)
	];
	const label = (force: Force) => `${force}, ${unitLabel(forceQuantity(force), preferences)}`;
	return [
		`<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} ${height}" width="${width}" height="${height}" font-family="sans-serif" font-size="12" fill="#1c2230">`,
		`<rect width="${width}" height="${height}" fill="#fff"/>`,
		`<text x="${margin}" y="28" font-size="15" font-weight="600">${escaped(title)}</text>`,
		`<path d="M${margin} ${y(0)}H${width - margin}M${x(0)} ${margin}V${height - margin}" stroke="#5f6675"/>`,
		...ticks,
		`<text x="${width - margin}" y="${height - 14}" text-anchor="end">${label(across)}</text>`,
		`<text x="${margin}" y="48">${label(up)}</text>`,
		...curves,
		'</svg>'
	].join('\n');
}

const escaped = (text: string) =>
	text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
