/** The demo workspace: a club that does not exist, its people, and what they study. Written into the database by `waypost seed`. */
import { carlsbad } from './demo/carlsbad';
import { frenchChain } from './demo/french-chain';
import { holeOnD5 } from './demo/hole-on-d5';
import { isolatedPawn } from './demo/isolated-pawn';
import type { DemoStudy } from './demo/types';

/** The club. */
export const DEMO_WORKSPACE = { name: 'Lantern Quay Chess Circle', slug: 'lantern-quay' } as const;

/** Its people, one in each role. The addresses are of a domain kept for examples, to which no mail can go. */
export const DEMO_PEOPLE = [
  { name: 'Maren Oakhollow', email: 'maren@lantern-quay.example', role: 'owner' },
  { name: 'Tibor Fennwick', email: 'tibor@lantern-quay.example', role: 'coach' },
  { name: 'Ysolde Marrinby', email: 'ysolde@lantern-quay.example', role: 'writer' },
  { name: 'Pell Ardenshaw', email: 'pell@lantern-quay.example', role: 'student' },
] as const;

/** What the club studies, in the order of its list. */
export const DEMO_STUDIES: readonly DemoStudy[] = [isolatedPawn, carlsbad, frenchChain, holeOnD5];
