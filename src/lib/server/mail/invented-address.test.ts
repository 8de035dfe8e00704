import { expect, it } from 'vitest';
import { isInventedAddress } from './invented-address';

it.each(['rhona@tarnbridge.example', 'a@b.test', 'root@localhost', 'A@B.C.EXAMPLE'])(
	'%s belongs to nobody real',
	(address) => expect(isInventedAddress(address)).toBe(true)
);

it.each(['a@tarnbridge.com', 'a@example.com', 'a@test.org', 'example', '"x@y.test"@real.org'])(
	'%s may be real',
	(address) => expect(isInventedAddress(address)).toBe(false)
);
