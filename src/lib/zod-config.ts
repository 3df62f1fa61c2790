import { z } from 'zod';

// Zod compiles schemas with `new Function` where it may; the content security policy says that it may not,
// and each attempt is reported as a violation. Imported before any schema.
z.config({ jitless: true });
