export * from './exchange';
export * from './safety';
