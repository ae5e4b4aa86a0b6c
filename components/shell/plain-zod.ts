import { z } from 'zod'

// Compiled checks need `eval`, which the content security policy forbids: asking for it is already a breach.
z.config({ jitless: true })

/** zod for code that runs in the browser. */
export { z }
