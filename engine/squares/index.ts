export * from './square-table';
export * from './weak-squares';
export * from './outposts';
export * from './totals';
