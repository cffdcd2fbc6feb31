/** A plate as plain data: marks with positions, drawn alike for the page, for SVG files and for print. */
import type { Reading, Statement } from '@/engine/reading/schema';
import type { SquareName } from '@/engine/types';

/** What a plate shows over the men. */
export const LAYERS = ['position', 'control', 'command', 'weak', 'outposts', 'files', 'mobility'] as const;
export type Layer = (typeof LAYERS)[number];

/** Paints by name; a theme gives each its colour, the page gives each its variable. */
export const PAINTS = [
  'paper',
  'raise',
  'ink',
  'soft',
  'hair',
  'rule',
  'hatch',
  'cross',
  'ochre',
  'indigo',
  'pick',
  'heat',
  'ochre-wash',
  'indigo-wash',
  'w-fill',
  'w-line',
  'w-cut',
  'b-fill',
  'b-line',
  'b-cut',
] as const;
export type Paint = (typeof PAINTS)[number] | 'none';

/** Strengths by name, likewise. */
export type Strength = 'wash-a' | 'band-a' | 'iwash-a' | 'iband-a';

export interface Look {
  readonly fill?: Paint | { readonly pattern: string };
  readonly stroke?: Paint;
  readonly width?: number;
  readonly dash?: string;
  readonly cap?: 'butt' | 'round' | 'square';
  readonly join?: 'miter' | 'round';
  readonly miter?: number;
  /** Opacity of the fill: a figure, a strength of the theme, or a heat of n safe moves. */
  readonly strength?: number | Strength | { readonly heat: number };
}

export type Mark =
  | ({ readonly type: 'path'; readonly d: string; readonly move?: Move } & Look)
  | ({ readonly type: 'circle'; readonly x: number; readonly y: number; readonly r: number } & Look)
  | {
      readonly type: 'text';
      readonly x: number;
      readonly y: number;
      readonly text: string;
      readonly size: number;
      readonly weight: 300 | 400 | 500 | 700;
      readonly fill: Paint;
      readonly anchor?: 'start' | 'middle' | 'end';
      /** Paper edge round the letters, px. */
      readonly halo?: number;
    }
  | {
      readonly type: 'group';
      readonly marks: readonly Mark[];
      /** The statement that the group belongs to. */
      readonly statement?: string;
      /** Names the group among its neighbours, so that a page can keep what stays. */
      readonly key?: string;
      /** Says all that the group's marks hang on: while it is the same, nothing needs drawing anew. */
      readonly stamp?: string;
    };

/** Shift and scale of a path drawn on its own grid. */
export interface Move {
  readonly x: number;
  readonly y: number;
  readonly scale: number;
}

export interface Pattern {
  readonly id: string;
  readonly size: number;
  readonly turned: boolean;
  readonly x: number;
  readonly y: number;
  readonly marks: readonly Mark[];
}

/** One square of a mobility heat map: see the engine's `HeatCell`, which has this shape. */
export interface HeatCell {
  readonly square: number;
  readonly moves: number;
  readonly safeMoves: number;
  readonly safe: boolean;
  readonly taken: boolean;
  readonly reached: number | null;
}

export interface PlateRequest {
  readonly reading: Reading;
  readonly layer: Layer;
  /** Width of the whole figure, px. */
  readonly width: number;
  /** One-colour print has forms of its own. */
  readonly print?: boolean;
  /** Black at the foot of the board. */
  readonly flipped?: boolean;
  /** Notes in the margin where there is room, as numbers with a list, or none. */
  readonly notes?: 'margin' | 'numbers' | 'none';
  /** What stands below the board in the figure itself; a page may write it as text instead. */
  readonly below?: 'drawn' | 'none';
  /** Keys of the statements to note; the reading's leading ones if not given. */
  readonly noted?: readonly string[];
  readonly chosen?: string | null;
  /** Squares lit because a sentence or a person points at them. */
  readonly lit?: readonly SquareName[];
  readonly man?: SquareName | null;
  readonly heat?: readonly HeatCell[] | null;
  readonly caption?: { readonly title: string; readonly text?: string } | null;
  /** Prefix of pattern ids, for several plates on one page. */
  readonly id?: string;
  /** What a view draws on the board besides the layer, in marks of its own. */
  readonly extra?: PlateExtra | null;
}

/** Marks of a view on a plate: under the men, over them, their legend, and their words for the alt text. */
export interface PlateExtra {
  readonly under?: (board: BoardPlace) => readonly Mark[];
  readonly over?: (board: BoardPlace) => readonly Mark[];
  readonly legend?: readonly LegendItem[];
  readonly alt: string;
}

/** Where the board stands in the figure: its corner, the side of a square, and who is at the foot. */
export interface BoardPlace {
  readonly x: number;
  readonly y: number;
  readonly size: number;
  readonly flipped: boolean;
}

/** A leading statement with its number on the plate. */
export interface PlacedNote {
  readonly number: number;
  readonly statement: Statement;
  readonly square: SquareName;
}

export interface LegendItem {
  readonly label: string;
  readonly marks: readonly Mark[];
}

export interface Plate {
  readonly width: number;
  readonly height: number;
  readonly board: BoardPlace;
  readonly patterns: readonly Pattern[];
  readonly marks: readonly Mark[];
  readonly title: string;
  readonly text: string;
  readonly alt: string;
  readonly notes: readonly PlacedNote[];
  readonly legend: readonly LegendItem[];
}

/** What both drawers need of a figure: a plate is one, a chart is another. */
export type Drawing = Pick<Plate, 'width' | 'height' | 'patterns' | 'marks' | 'title' | 'alt'>;
