export * from './squares';
export * from './square-set';
export * from './position';
export * from './geometry';
