/** Longest wait for the rest of a body that nobody wants, ms. */
const patience = 2000;

const readToTheEnd = async (body: ReadableStream<Uint8Array>) => {
	const reader = body.getReader();
	try {
		while (!(await reader.read()).done);
	} catch {
		// The connection is gone, or the server's own limit has cut it off: nothing left to read.
	}
};

/**
 * Reads and drops what a refused request still sends: an unread body blocks the connection, and
 * with it the caller's next request.
 */
export const dropUnreadBody = async ({ body, bodyUsed }: Request): Promise<void> => {
	if (!body || bodyUsed) return;
	let timer: NodeJS.Timeout | undefined;
	const late = new Promise<void>((resolve) => (timer = setTimeout(resolve, patience)));
	await Promise.race([readToTheEnd(body), late]);
	clearTimeout(timer);
};
