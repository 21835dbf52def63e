import { config } from 'zod'

// The pages' policy forbids compiling code from text, which zod would try for speed; it must be told before the first
// schema is made, so this stands first in the group.
config({ jitless: true })
