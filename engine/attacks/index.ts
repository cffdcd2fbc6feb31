export * from './attack-map';
export * from './behind';
export * from './queries';
