import { z } from 'zod';

// Must be the first import of each entry: schemas look for a faster parser as soon as they are made, and that probe
// needs `eval`, which the content policy forbids.
z.config({ jitless: true });
