export * from './explain';
export type { Fact, FactId } from './fact';
export type { ReadingValues } from './values';
export { routeFaultText, type RouteFacts, routeText, stepReason } from './route-words';
export { type Phrase, type Phrases, phraseText } from './phrase';
export { capital, counted, inView, inWords, listed, type ManAt, name, possessive, theMan, theMen } from './words';
