import { z } from 'zod';

// The content security policy lets nothing compile code at run time. Without this every schema would
// first find that out, and the browser would report each try.
z.config({ jitless: true });
