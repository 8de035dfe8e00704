/** Version of the figures: raised whenever any result may change. */
export const engineVersion = '0.2.0';

/** Version of the HTTP contract that results follow. */
export const contractVersion = 1;

/** Version of a stored section definition; see section/migrate.ts. */
export const schemaVersion = 1;
