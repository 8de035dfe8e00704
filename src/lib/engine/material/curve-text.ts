import { fail, ok, type Issue, type Result } from '../result';

/** How the columns are written; taken from the header where it says so, else plain and MPa. */
export interface CurveUnits {
	strain?: 'plain' | 'percent' | 'per-mille';
	stress?: 'MPa' | 'ksi';
	/** Whether the curve may fall (softening); refused unless allowed. */
	softening?: boolean;
}

type CurvePoint = readonly [strain: number, stress: number];

/** N/mm² in a ksi (1000 lbf/in², exact definitions of pound, standard gravity and inch). */
const ksi = 6.894757293168361;
/** Most points of one curve, as the API has it. */
const mostPoints = 500;

/**
 * A test curve from text of two columns, strain and stress: comma, semicolon, tab or space between
 * them; a decimal comma where the separator is another sign. Empty lines and lines that begin with #
 * are passed over; the first line may be a header, which may name units (%, ‰, ksi, MPa). Strains must
 * rise; (0, 0) may be given or not. Gives [strain, stress] with stress in N/mm², for both columns
 * positive. Each issue's path is its line number.
 */
export function curveOfText(text: string, units: CurveUnits = {}): Result<CurvePoint[], Issue[]> {
	const lines = text
		.replace(/^\uFEFF/, '')
		.split(/\r\n|\r|\n/)
		.map((line, i) => ({ line: line.trim(), number: i + 1 }))
		.filter(({ line }) => line !== '' && !line.startsWith('#'));
	const first = lines[0];
	if (!first) return fail([{ path: '1', message: 'The curve is empty.' }]);
	const header = isHeader(first.line) ? first.line : '';
	const rows = header ? lines.slice(1) : lines;
	const scale = { strain: strainScale(header, units), stress: stressScale(header, units) };
	const issues: Issue[] = [];
	const points: CurvePoint[] = [];
	for (const { line, number } of rows) {
		const read = pairOf(line);
		if (!read) {
			issues.push(
				issueAt(number, `needs two numbers, a strain and a stress, not “${line.slice(0, 40)}”.`)
			);
			continue;
		}
		const point = [read[0] * scale.strain, read[1] * scale.stress] as const;
		if (points.length === 0 && point[0] === 0 && point[1] === 0) continue;
		const wrong = pointIssue(point, points.at(-1) ?? [0, 0], units.softening === true);
		if (wrong) issues.push(issueAt(number, wrong));
		points.push(point);
	}
	if (points.length === 0 && issues.length === 0)
		issues.push(issueAt(first.number, 'the curve needs at least one point above 0.'));
	if (points.length > mostPoints)
		issues.push(
			issueAt(first.number, `a curve may have at most ${mostPoints} points, not ${points.length}.`)
		);
	return issues.length > 0 ? fail(issues) : ok([[0, 0], ...points]);
}

const issueAt = (line: number, message: string): Issue => ({
	path: String(line),
	message: `Line ${line}: ${message}`
});

function pointIssue(
	[strain, stress]: CurvePoint,
	[strainBefore, stressBefore]: CurvePoint,
	softening: boolean
): string | null {
	if (strain < 0 || stress < 0)
		return 'strains and stresses must be positive, for compression too.';
	if (!(strain > strainBefore)) return 'the strain must be greater than on the line before.';
	if (strainBefore === 0 && !(stress > 0)) return 'the curve must begin with a stress above 0.';
	if (!softening && stress < stressBefore)
		return 'the stress falls. Smooth the curve, or allow softening: a falling curve can have several states for one curvature.';
	return null;
}

const isHeader = (line: string): boolean => pairOf(line) === null && /[a-zε-ω%‰]/i.test(line);

function strainScale(header: string, { strain }: CurveUnits): number {
	const unit =
		strain ?? (header.includes('%') ? 'percent' : header.includes('‰') ? 'per-mille' : 'plain');
	return unit === 'percent' ? 1e-2 : unit === 'per-mille' ? 1e-3 : 1;
}

const stressScale = (header: string, { stress }: CurveUnits): number =>
	(stress ?? (/ksi/i.test(header) ? 'ksi' : 'MPa')) === 'ksi' ? ksi : 1;

/** The two numbers of a line. A comma parts columns only where nothing else does. */
function pairOf(line: string): [number, number] | null {
	const separator = line.includes(';') ? ';' : line.includes('\t') ? '\t' : null;
	const cells = separator ? line.split(separator) : line.includes(', ') ? line.split(', ') : null;
	const parts = cells ?? (/\s/.test(line) ? line.split(/\s+/) : line.split(','));
	const values = parts.map((cell) => numberOf(cell.trim()));
	const [strain, stress, ...rest] = values;
	if (strain === undefined || stress === undefined || rest.length > 0) return null;
	return Number.isFinite(strain) && Number.isFinite(stress) ? [strain, stress] : null;
}

const numberOf = (cell: string): number =>
	/^[+-]?(\d+([.,]\d*)?|[.,]\d+)(e[+-]?\d+)?$/i.test(cell) ? Number(cell.replace(',', '.')) : NaN;
