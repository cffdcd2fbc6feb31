export * from './squares';
export * from './bits';
export * from './position';
export * from './geometry';
export * from './words';
export * from './fault';
export * from './legality';
export * from './fen';
export { codeOfLetter } from './fen-board';
