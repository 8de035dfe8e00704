/** What an error page says for a status: what happened, and what to do about it. */
export interface ErrorWords {
	title: string;
	what: string;
	act: string;
	retry?: boolean;
	signIn?: boolean;
}

const known: Record<number, ErrorWords> = {
	401: {
		title: 'Sign in to see this.',
		what: 'This page belongs to a firm and is shown to its people only.',
		act: 'Sign in, then open the link once more.',
		signIn: true
	},
	403: {
		title: 'Your role does not reach this.',
		what: 'You are signed in, but your role in this firm does not allow what was asked.',
		act: 'Ask an owner of the firm to change your role, or go back to where you were.'
	},
	404: {
		title: 'Nothing stands at this address.',
		what: 'The page was moved, deleted, or the address has a slip in it.',
		act: 'Check the address, or start from the Bench.'
	},
	429: {
		title: 'Too many requests at once.',
		what: 'The server takes a limited number of requests a minute from one place.',
		act: 'Wait a minute and load the page again.',
		retry: true
	},
	503: {
		title: 'The server is not ready.',
		what: 'It is starting, or its database does not answer.',
		act: 'Wait a moment and load the page again.',
		retry: true
	}
};

const refused: ErrorWords = {
	title: 'The request was refused.',
	what: 'Something in what was sent is not as it should be.',
	act: 'Go back, check what you entered and try once more.'
};

const broken: ErrorWords = {
	title: 'Something broke on our side.',
	what: 'The fault has been written to the log. What you had saved is safe.',
	act: 'Load the page again. If it happens twice, report it with the request below.',
	retry: true
};

export const errorWords = (status: number): ErrorWords =>
	known[status] ?? (status < 500 ? refused : broken);

/** What the framework says when a route said nothing of its own. */
const unsaid = ['Not Found', 'Internal Error', 'Unauthorized', 'Forbidden'];

/** The route's own sentence, if it wrote one; nothing of a fault inside the server. */
export function errorDetail(status: number, message: string | undefined): string | undefined {
	if (status >= 500 || !message || unsaid.includes(message)) return undefined;
	return message;
}
