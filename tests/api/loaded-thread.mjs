/** The computing thread outside the build: with a loader for TypeScript. */
import { register } from 'tsx/esm/api';

register();
await import(new URL('../../lib/compute/thread.ts', import.meta.url).href);
