/** Whether the caller already holds the version named by `tag`, from its If-None-Match header. */
export const holdsVersion = (request: Request, tag: string): boolean =>
	(request.headers.get('if-none-match') ?? '')
		.split(',')
		.map((one) => one.trim().replace(/^W\//, ''))
		.some((one) => one === `"${tag}"` || one === '*');
