/** Every call of the API, by its id. */
import type { Contract } from '../contract';
import { createReadings } from './batch';
import { getDocument, getIndex, getProblem } from './document';
import { getHealth } from './health';
import { getPlatePng, getPlateSvg } from './plates';
import { createReading, getReading } from './readings';
import { createRouteCheck, createRoutes } from './routes';

export const contracts = {
  createReading,
  getReading,
  createReadings,
  createRoutes,
  createRouteCheck,
  getPlateSvg,
  getPlatePng,
  getIndex,
  getDocument,
  getProblem,
  getHealth,
} as const;

/** The same as a list, in the order of the document. */
export const contractList: readonly Contract[] = Object.values(contracts);
