export * from './files';
export * from './seventh-rank';
export * from './diagonals';
