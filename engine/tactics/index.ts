export * from './search';
export * from './guard';
