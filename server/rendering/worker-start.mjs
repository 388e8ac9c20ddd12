// Plain JavaScript, because `--import tsx` does not reach worker threads on Node.js 20: the thread starts here, learns
// TypeScript, and goes on in worker.ts. Works the same under tsx, vitest and plain node.
import { register } from 'tsx/esm/api'

register()
await import('./worker.ts')
