/** All facts as one union. */
import type { Theme } from '../types';
import type { ControlFact } from './facts/control';
import type { FilesFact } from './facts/files';
import type { KingFact } from './facts/king';
import type { MenFact } from './facts/men';
import type { OutpostsFact } from './facts/outposts';
import type { SquaresFact } from './facts/squares';
import type { StructureFact } from './facts/structure';

/** The facts of each theme. */
export interface FactsByTheme {
  readonly structure: StructureFact;
  readonly squares: SquaresFact;
  readonly outposts: OutpostsFact;
  readonly files: FilesFact;
  readonly men: MenFact;
  readonly king: KingFact;
  readonly control: ControlFact;
}

export type Fact = FactsByTheme[Theme];
export type FactId = Fact['id'];
