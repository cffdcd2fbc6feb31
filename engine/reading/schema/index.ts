export * from './basics';
export * from './reading';
export * from './statement';
