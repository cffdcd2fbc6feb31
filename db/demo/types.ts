/** What the demo workspace is written down as. */

/** A position of a demo study: where it comes from, and what is said of it. */
export interface DemoPosition {
  readonly title: string;
  /** The opening moves that lead to it, in SAN; tests play them and come to the FEN. */
  readonly line: string;
  readonly fen: string;
  /** Markdown. Every count and claim in it is one that the reading makes too; tests hold the two together. */
  readonly note: string;
  readonly layer: 'control' | 'command' | 'weak' | 'outposts' | 'files' | 'mobility' | 'routes';
  /** The square of the man whose layer is shown. */
  readonly man?: string;
  readonly marks?: readonly { readonly square: string; readonly to?: string; readonly text?: string }[];
}

/** A study of the demo workspace. */
export interface DemoStudy {
  readonly title: string;
  readonly summary: string;
  /** Whether the club's student may read it. */
  readonly shared: boolean;
  readonly positions: readonly DemoPosition[];
}
