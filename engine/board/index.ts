export * from './squares';
export * from './square-set';
export * from './position';
export * from './geometry';
export * from './fault';
export * from './legality';
export * from './fen';
export { codeOfLetter, manLetter } from './fen-board';
