import { createHmac } from 'node:crypto';
import { isIPv6 } from 'node:net';

/** The first 64 bits of an IPv6 address: one household or machine changes the rest at will. */
const network = (address: string): string => {
	const [head = '', tail] = address.split('::');
	const groups = head === '' ? [] : head.split(':');
	const rest = tail ? tail.split(':').length : 0;
	const zeros = tail === undefined ? 0 : Math.max(0, 8 - groups.length - rest);
	const all = [...groups, ...Array<string>(zeros).fill('0'), ...(tail ? tail.split(':') : [])];
	return all
		.slice(0, 4)
		.map((group) => group.padStart(4, '0'))
		.join(':');
};

const plain = (address: string): string => {
	const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address)?.[1];
	if (mapped) return mapped;
	return isIPv6(address) ? network(address.toLowerCase()) : address;
};

/** Keyed hash of a client's address (43 characters): equal for equal clients, not to be reversed. */
export const clientKey = (address: string, secret: string): string =>
	createHmac('sha256', secret).update(plain(address)).digest('base64url');
