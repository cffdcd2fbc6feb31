/** What the server's thread and a computing thread say to each other. */
import type { Job, Outcome } from './jobs';

export interface Asked {
  readonly id: number;
  readonly job: Job;
}

export type Answered =
  | { readonly id: number; readonly outcome: Outcome<Job> }
  | { readonly id: number; readonly mistake: string };
