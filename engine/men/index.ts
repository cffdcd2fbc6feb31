export * from './moves';
export * from './duties';
export * from './man-value';
export * from './bishops';
export * from './kings';
export * from './heat-map';
