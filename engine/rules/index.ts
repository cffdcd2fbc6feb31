export * from './move';
export * from './legal';
export * from './replay';
