export * from './weights';
export * from './ground';
export * from './count-parts';
