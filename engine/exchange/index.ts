export * from './exchange';
