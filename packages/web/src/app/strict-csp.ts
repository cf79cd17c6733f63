import { config } from 'zod';

// Before any schema is made: zod would otherwise try to compile its parsers, which the content security policy forbids.
config({ jitless: true });
