export * from './move';
export * from './legal';
