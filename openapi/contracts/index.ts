/** Every call of the API, by its id. */
import type { Contract } from '../contract';
import { createReadings } from './batch';
import { createComparison, createExchanges } from './compare';
import { getDocument, getIndex, getProblem } from './document';
import { exportStudyCsv, exportStudyJson, exportStudyPgn } from './exports';
import { createGames } from './games';
import { getHealth } from './health';
import { cancelJob, createJob, getJob, listJobItems, listJobs, retryJob, watchJob } from './jobs';
import { createKey, getUsage, listKeys, revokeKey } from './keys';
import { getPlatePng, getPlateSvg } from './plates';
import {
  changePosition,
  createPosition,
  deletePosition,
  getPosition,
  listPositions,
  restorePosition,
} from './positions';
import { createReading, getReading } from './readings';
import { studyComparisons, studyExchanges, studyRoutes } from './results';
import { createRouteCheck, createRoutes } from './routes';
import { getSheet, getStructure, listStructures } from './structures';
import {
  changeStudy,
  createStudy,
  deleteStudy,
  getShares,
  getStudy,
  listChanges,
  listStudies,
  putShares,
  restoreStudy,
} from './studies';

export const contracts = {
  createReading,
  getReading,
  createReadings,
  createRoutes,
  createRouteCheck,
  createComparison,
  createExchanges,
  createGames,
  listStructures,
  getStructure,
  getSheet,
  getPlateSvg,
  getPlatePng,
  listStudies,
  createStudy,
  getStudy,
  changeStudy,
  deleteStudy,
  restoreStudy,
  listChanges,
  getShares,
  putShares,
  exportStudyPgn,
  exportStudyCsv,
  exportStudyJson,
  listPositions,
  createPosition,
  getPosition,
  changePosition,
  deletePosition,
  restorePosition,
  listStudyRoutes: studyRoutes.list,
  createStudyRoute: studyRoutes.create,
  getStudyRoute: studyRoutes.get,
  changeStudyRoute: studyRoutes.change,
  deleteStudyRoute: studyRoutes.remove,
  restoreStudyRoute: studyRoutes.restore,
  listStudyComparisons: studyComparisons.list,
  createStudyComparison: studyComparisons.create,
  getStudyComparison: studyComparisons.get,
  changeStudyComparison: studyComparisons.change,
  deleteStudyComparison: studyComparisons.remove,
  restoreStudyComparison: studyComparisons.restore,
  listStudyExchanges: studyExchanges.list,
  createStudyExchange: studyExchanges.create,
  getStudyExchange: studyExchanges.get,
  changeStudyExchange: studyExchanges.change,
  deleteStudyExchange: studyExchanges.remove,
  restoreStudyExchange: studyExchanges.restore,
  listJobs,
  createJob,
  getJob,
  watchJob,
  listJobItems,
  cancelJob,
  retryJob,
  listKeys,
  createKey,
  revokeKey,
  getUsage,
  getIndex,
  getDocument,
  getProblem,
  getHealth,
} as const;

/** The same as a list, in the order of the document. */
export const contractList: readonly Contract[] = Object.values(contracts);
