/** The computing thread outside the build: with a loader for TypeScript. */
import { register } from 'tsx/esm/api';

register();
await import('../../lib/compute/thread.ts');
