export * from './heat';
export * from './read';
export * from './read-values';
export * from './version';
export type * from './schema';
