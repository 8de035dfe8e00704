import pino from 'pino';
import { currentRequestId } from './request-id';

/** One JSON object a line; inside a request every line carries its id. */
export const log = pino({
	level: process.env.LOG_LEVEL || 'info',
	base: null,
	timestamp: pino.stdTimeFunctions.isoTime,
	formatters: { level: (label) => ({ level: label }) },
	redact: ['password', '*.password', 'token', '*.token', 'secret', '*.secret'],
	mixin: () => {
		const requestId = currentRequestId();
		return requestId ? { requestId } : {};
	}
});
