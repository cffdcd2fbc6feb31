export * from './attack-map';
export * from './queries';
