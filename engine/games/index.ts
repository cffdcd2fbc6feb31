export * from './pgn';
export * from './pgn-stream';
export * from './replay';
export * from './compact';
export * from './commitments';
export * from './journeys';
export * from './read-game';
export * from './write-pgn';
