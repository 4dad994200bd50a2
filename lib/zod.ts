/**
 * The one door to zod. Its just-in-time compiler probes `new Function`, which the content security
 * policy refuses; the interpreter is fast enough for every form and sheet here.
 */
import * as z from 'zod'

z.config({ jitless: true })

export { z }
