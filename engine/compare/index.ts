export * from './difference';
export * from './compare';
export * from './placement';
export * from './exchanges';
