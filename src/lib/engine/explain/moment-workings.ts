import { extentAcross } from '../geometry/bounds';
import { frameAt } from '../geometry/frame';
import { lawLimits } from '../material/laws';
import type { MomentFigures } from '../rules/section-moments';
import type { PreparedSection } from '../section/prepared';
import { partSplits } from './block-parts';
import { workingKey } from './keys';
import { partAreas, partInputs, partSum } from './part-inputs';
import type { Working, WorkingInput, Workings } from './working';

type Body = Omit<Working, 'clause' | 'edition'>;

const clause = 'mechanics';
const edition = '—';

/** Workings of the contract's `moment` and of the squash load. */
export function momentWorkings(
	workings: Workings,
	section: PreparedSection,
	moment: MomentFigures,
	squash: number
): void {
	const add = (key: string, body: Body | null) => {
		if (body) workings.add(key, () => ({ ...body, clause, edition }));
	};
	for (const axis of ['Y', 'Z'] as const) {
		const key = (figure: string) => workingKey.moment(`${figure}${axis}`);
		add(key('firstYield'), firstYieldBody(section, axis, moment[`firstYield${axis}`]));
		add(key('plastic'), plasticBody(section, axis, moment));
		add(key('shapeFactor'), shapeBody(axis, moment));
	}
	add(workingKey.moment('plasticNeutralAxisZ'), axisBody(section, 'z', moment.plasticNeutralAxisZ));
	add(workingKey.moment('plasticNeutralAxisY'), axisBody(section, 'y', moment.plasticNeutralAxisY));
	add(workingKey.squashLoad, squashBody(section, squash));
	add(workingKey.yieldLoad, yieldBody(section));
}

const kNm = (value: number) => ({ value, unit: 'kNm' });

/** Two ways to one figure agree to this share. */
const same = 1e-10;

/** fy I/z of the edge that yields first, where the elastic stress is a straight line. */
function firstYieldBody(
	section: PreparedSection,
	axis: 'Y' | 'Z',
	value: number | null
): Body | null {
	if (value === null) return null;
	const I = section.gross[axis === 'Y' ? 'secondMomentY' : 'secondMomentZ'];
	const title = `Moment about ${axis.toLowerCase()}–${axis.toLowerCase()} at which a fibre first yields`;
	const edge = firstEdge(section, axis);
	const found = (edge.fy * I * 1e-6) / Math.abs(edge.across);
	if (Math.abs(found / value - 1) > same)
		return {
			title,
			formula: 'M_el = M_y1',
			inputs: [
				{
					symbol: 'M_y1',
					value,
					unit: 'kNm',
					from: 'curvature at which the first fibre reaches the end of its elastic range'
				}
			],
			result: kNm(value)
		};
	return {
		title,
		formula: 'M_el = fy·I/abs(e)·10^-6',
		inputs: [
			{ symbol: 'fy', value: edge.fy, unit: 'N/mm²', from: edge.name },
			{ symbol: 'I', value: I, unit: 'mm⁴', from: workingKey.gross(`secondMoment${axis}`) },
			{
				symbol: 'e',
				value: edge.across,
				unit: 'mm',
				from: `edge of ${edge.name} from the centroid`
			}
		],
		result: kNm(value)
	};
}

interface Edge {
	readonly name: string;
	readonly fy: number;
	readonly across: number;
}

function firstEdge(section: PreparedSection, axis: 'Y' | 'Z'): Edge {
	const edges = partEdges(section, axis);
	return edges.reduce((a, b) => (b.fy * Math.abs(a.across) < a.fy * Math.abs(b.across) ? b : a));
}

/** Both outermost edges of every part across the axis, with the lesser of its strengths. */
function partEdges(section: PreparedSection, axis: 'Y' | 'Z'): Edge[] {
	const angle = axis === 'Y' ? 0 : 90;
	return partExtents(section, angle).flatMap(({ name, low, high, fy }) =>
		[low, high].map((across) => ({ name, fy, across }))
	);
}

function partExtents({ parts, gross: { centroid } }: PreparedSection, angle: number) {
	const frame = frameAt(centroid, (angle * Math.PI) / 180);
	return parts.map(({ name, region, material: { fy, fyc } }) => ({
		name,
		fy: Math.min(fy, fyc),
		...extentAcross(region.loops, frame)
	}));
}

/** Forces of the block times their arms: fyc of what lies above the neutral axis, fy of what lies below. */
function plasticBody(
	section: PreparedSection,
	axis: 'Y' | 'Z',
	moment: MomentFigures
): Body | null {
	const value = moment[`plastic${axis}`];
	const { y, z } = section.gross.centroid;
	const at = axis === 'Y' ? moment.plasticNeutralAxisZ : moment.plasticNeutralAxisY;
	if (value === null || at === null) return null;
	const splits = partSplits(section, axis === 'Y' ? 0 : 90, axis === 'Y' ? at - z : y - at);
	const inputs = splits.flatMap((part, i): WorkingInput[] => [
		{
			symbol: `fc_${i + 1}`,
			value: strengthOf(section, i, 'compression'),
			unit: 'N/mm²',
			from: part.name
		},
		{ symbol: `S_${i + 1}`, value: part.firstAbove, unit: 'mm³', from: `${part.name}, compressed` },
		{
			symbol: `ft_${i + 1}`,
			value: strengthOf(section, i, 'tension'),
			unit: 'N/mm²',
			from: part.name
		},
		{ symbol: `T_${i + 1}`, value: part.firstBelow, unit: 'mm³', from: `${part.name}, pulled` }
	]);
	const terms = splits.map((_, i) => `fc_${i + 1}·S_${i + 1} − ft_${i + 1}·T_${i + 1}`);
	return {
		title: `Full plastic moment about ${axis.toLowerCase()}–${axis.toLowerCase()}`,
		formula: `M_pl = (${terms.join(' + ')})·10^-6`,
		inputs,
		result: kNm(value)
	};
}

/** A part's strength in the block: its grade's, or less where its law never gets there. */
function strengthOf({ parts }: PreparedSection, place: number, sense: 'tension' | 'compression') {
	const { fy, fyc, law } = parts[place]!.material;
	const strength = sense === 'tension' ? fy : fyc;
	const most = lawLimits(law)[sense];
	return most < strength * (1 - 1e-12) ? most : strength;
}

function shapeBody(axis: 'Y' | 'Z', moment: MomentFigures): Body | null {
	const [factor, plastic, elastic] = [
		moment[`shapeFactor${axis}`],
		moment[`plastic${axis}`],
		moment[`firstYield${axis}`]
	];
	if (factor === null || plastic === null || elastic === null) return null;
	return {
		title: `Shape factor about ${axis.toLowerCase()}–${axis.toLowerCase()}`,
		formula: 'α = M_pl/M_el',
		inputs: [
			{ symbol: 'M_pl', value: plastic, unit: 'kNm', from: workingKey.moment(`plastic${axis}`) },
			{ symbol: 'M_el', value: elastic, unit: 'kNm', from: workingKey.moment(`firstYield${axis}`) }
		],
		result: { value: factor, unit: '' }
	};
}

function axisBody(
	{ gross: { centroid } }: PreparedSection,
	across: 'y' | 'z',
	value: number | null
): Body | null {
	if (value === null) return null;
	return {
		title: `Plastic neutral axis, ${across} from the origin`,
		formula: `${across}_pl = ${across}_c + e`,
		inputs: [
			{
				symbol: `${across}_c`,
				value: centroid[across],
				unit: 'mm',
				from: workingKey.gross(`centroid.${across}`)
			},
			{
				symbol: 'e',
				value: value - centroid[across],
				unit: 'mm',
				from: 'from the centroid to where tension and compression balance'
			}
		],
		result: { value, unit: 'mm' }
	};
}

/** Every part at its own strength in tension, kN. */
function yieldBody(section: PreparedSection): Body {
	const parts = partAreas(section);
	return {
		title: 'Yield load: every part at its own strength in tension',
		formula: `N_y = (${partSum(parts, (i) => `A_${i}·fy_${i}`)})·10^-3`,
		inputs: [
			...partInputs(parts, 'A', 'mm²', ({ area }) => area),
			...partInputs(parts, 'fy', 'N/mm²', ({ fy }) => fy)
		],
		result: { value: parts.reduce((sum, { area, fy }) => sum + area * fy * 1e-3, 0), unit: 'kN' }
	};
}

function squashBody(section: PreparedSection, value: number): Body {
	const parts = partAreas(section);
	const places = new Map(parts.map((part, i) => [part, i]));
	return {
		title: 'Squash load: every part at its own compressive strength',
		formula: `N_pl = (${partSum(parts, (i) => `A_${i}·fc_${i}`)})·10^-3`,
		inputs: [
			...partInputs(parts, 'A', 'mm²', ({ area }) => area),
			...partInputs(parts, 'fc', 'N/mm²', (part) =>
				strengthOf(section, places.get(part)!, 'compression')
			)
		],
		result: { value, unit: 'kN' }
	};
}
