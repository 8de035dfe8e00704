/** All tolerances are relative and live here. */

/** Smallest and largest size accepted for a dimension, mm. */
export const sizeLimits = { least: 0.01, most: 100_000 } as const;

/** Largest distance of a coordinate from the origin, mm. */
export const coordinateLimit = 1_000_000;

/** Two lengths are the same when they differ by less than this share of the section's size. */
export const sameLength = 1e-9;

/** A state is converged when its residual force is below this share of the squash load (and the moment alike). */
export const equilibrium = 1e-11;

/** Newton stops when a step changes the unknown by less than this share. */
export const step = 1e-14;

/**
 * Edges of plates or regions touch when they are no further apart (or deeper in each other) than the
 * lesser of these shares of the section's size and of the smallest thickness.
 */
export const contact = { ofSize: 1e-6, ofThickness: 1e-3 } as const;

/** Rounding of a coordinate, as a share of its distance from the origin. */
export const coordinateRounding = 8 * Number.EPSILON;
