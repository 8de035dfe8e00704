/** Endings that are reserved and never belong to a real mailbox (RFC 2606, RFC 6761). */
const reservedEndings = ['example', 'test', 'localhost'];

/** Whether mail to this address can never reach a real person. */
export const isInventedAddress = (address: string): boolean => {
	const domain = address.slice(address.lastIndexOf('@') + 1).toLowerCase();
	const ending = domain.slice(domain.lastIndexOf('.') + 1);
	return address.includes('@') && reservedEndings.includes(ending);
};
