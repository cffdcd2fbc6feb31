/** The whole outside world of a service: who asks, what time it is, where to compute, and whether anyone still waits. */
import { type Computing, computing } from '@/lib/compute/computing';

/** Who asks. Nobody signs in for the calls there are now. */
export interface Actor {
  readonly kind: 'anonymous';
}

export interface Context {
  readonly actor: Actor;
  /** Also in the answer's X-Request-Id header and in every log line. */
  readonly requestId: string;
  readonly now: () => Date;
  readonly compute: Computing;
  /** Aborted when the caller has gone away. */
  readonly signal: AbortSignal;
}

/** The context of a request by somebody who has not signed in. */
export function anonymousContext(requestId: string, signal: AbortSignal): Context {
  return { actor: { kind: 'anonymous' }, requestId, now: () => new Date(), compute: computing, signal };
}
