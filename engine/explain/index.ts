export * from './explain';
export type { Fact, FactId } from './fact';
export type { ReadingValues } from './values';
export { routeFaultText, type RouteFacts, routeText, stepReason } from './route-words';
