import { z } from 'zod'

// Zod probes `new Function` to compile its checks, which our content security policy reports.
// Everybody imports `z` from here, so this line stands before any schema.
z.config({ jitless: true })

export { z }
