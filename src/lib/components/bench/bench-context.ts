import { getContext, setContext } from 'svelte';
import type { Bench } from './bench.svelte';

const key = Symbol('bench');

/** Gives the Bench to the components below. */
export const provideBench = (bench: Bench): Bench => setContext(key, bench);

/** The Bench for a component that stands alone, as in a test. */
export const benchContext = (bench: Bench): Map<unknown, unknown> => new Map([[key, bench]]);

/** The Bench this component stands on. */
export const useBench = (): Bench => getContext<Bench>(key);
