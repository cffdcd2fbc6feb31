/** Every kind of job, by the name that it is stored under. */
import { importJob } from './import';
import { readingsJob } from './readings';
import { recomputeJob } from './recompute';
import type { JobKind } from './worker';

export const JOB_KINDS: Readonly<Record<string, JobKind>> = {
  readings: readingsJob,
  import: importJob,
  recompute: recomputeJob,
};
