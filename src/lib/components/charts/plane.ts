import type { ScaleLinear } from 'd3';
import { getLayerCakeContext } from 'layercake';

type Scales = { x: ScaleLinear<number, number>; y: ScaleLinear<number, number> };

/** The plane of a chart with two straight scales. Read its fields in place: they follow the size. */
export const useChartPlane = () => getLayerCakeContext<Scales>();
