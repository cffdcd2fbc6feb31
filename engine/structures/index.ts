export * from './model';
export * from './table';
export * from './name-structure';
export * from './structure-lead';
export * from './sheets';
