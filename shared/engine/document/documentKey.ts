import { z } from 'zod'

const KEY_MAX = 80

/** What things in a document call each other by. Any text: other programs bring keys of their own. */
export const documentKey = z.string().trim().min(1, 'is empty').max(KEY_MAX)
