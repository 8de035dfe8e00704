import { expect, test } from 'vitest';
import { clientKey } from './client-key';

const key = (address: string) => clientKey(address, 'secret');

test('a client key has 43 characters and does not hold the address', () => {
	expect(key('192.0.2.7')).toHaveLength(43);
	expect(key('192.0.2.7')).not.toContain('192');
});

test('IPv4 in IPv6 clothes is the same client', () => {
	expect(key('::ffff:192.0.2.7')).toBe(key('192.0.2.7'));
});

test('addresses of one IPv6 network are one client, others are not', () => {
	expect(key('2001:db8:1:2::7')).toBe(key('2001:db8:1:2:aaaa::8'));
	expect(key('2001:0db8:1:2:3:4:5:6')).toBe(key('2001:db8:1:2::7'));
	expect(key('2001:db8:1:3::7')).not.toBe(key('2001:db8:1:2::7'));
});

test('another secret gives another key', () => {
	expect(clientKey('192.0.2.7', 'other')).not.toBe(key('192.0.2.7'));
});
