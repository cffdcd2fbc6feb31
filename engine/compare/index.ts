export * from './difference';
export * from './compare';
export * from './placement';
export * from './exchanges';
export { FEWER_IS_BETTER, gainOf } from './counts';
