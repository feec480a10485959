/* The entry of a checker thread: TypeScript is loaded through tsx, which a thread's own entry cannot be. */
import { register } from 'tsx/esm/api';

register();
await import('./check-worker.ts');
