interface Failure {
	code?: string;
	errno?: number;
}

const isFailure = (error: unknown): error is Failure & { cause?: unknown } =>
	typeof error === 'object' && error !== null;

/** The database's own code and number behind an error, however deep it was wrapped. */
export const databaseFailure = (error: unknown): Failure | null => {
	let current = error;
	for (let depth = 0; depth < 6 && isFailure(current); depth += 1) {
		if (typeof current.errno === 'number' || typeof current.code === 'string')
			return { code: current.code, errno: current.errno };
		current = current.cause;
	}
	return null;
};

const awayCodes = new Set([
	'ECONNREFUSED',
	'ECONNRESET',
	'ETIMEDOUT',
	'EPIPE',
	'EHOSTUNREACH',
	'ENETUNREACH',
	'ENOTFOUND',
	'EAI_AGAIN',
	'PROTOCOL_CONNECTION_LOST',
	'PROTOCOL_SEQUENCE_TIMEOUT',
	'ER_SERVER_SHUTDOWN',
	'ER_CON_COUNT_ERROR'
]);

/** True when the database could not be reached, as against a statement it refused. */
export const isDatabaseAway = (error: unknown): boolean => {
	const failure = databaseFailure(error);
	return failure?.code !== undefined && awayCodes.has(failure.code);
};
