export * from './pawn-map';
export * from './pawn-reach';
export * from './levers';
export * from './pawn-reading';
export * from './pawn-sides';
export * from './pawn-values';
