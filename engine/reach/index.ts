export * from './reach';
