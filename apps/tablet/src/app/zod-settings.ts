import { z } from 'zod';

// Its own compiler wants `new Function`, which the page's security policy forbids.
z.config({ jitless: true });
