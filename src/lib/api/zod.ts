import { z } from 'zod';

// Compiled parsers need `eval`, which the page's content security policy forbids.
if (typeof window !== 'undefined') z.config({ jitless: true });

export { z };
