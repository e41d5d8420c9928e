import { convertEndpoint } from './attitude.ts';
import { getConventionEndpoint, listConventionsEndpoint } from './conventions.ts';
import type { Endpoint } from './endpoint.ts';
import { healthEndpoint } from './health.ts';
import { changeHistorySettingsEndpoint, exportHistoryEndpoint, getHistoryEntryEndpoint, getHistorySettingsEndpoint, listHistoryEndpoint } from './history.ts';
import { issueKeyEndpoint, listKeysEndpoint, revokeKeyEndpoint } from './keys.ts';
import { identifyEndpoint } from './identify.ts';
import { ratesEndpoint } from './rates.ts';
import { resolveEndpoint } from './resolve.ts';
import { rigidBodyEndpoint } from './rigid-body.ts';
import { getRunEndpoint, getRunJUnitEndpoint, listRunsEndpoint, verifyEndpoint, verifyRatesEndpoint } from './runs.ts';
import { currentSessionEndpoint, signInEndpoint, signOutEndpoint } from './sessions.ts';
import { changeKeyLimitsEndpoint, changeLimitsEndpoint, listLimitsEndpoint, ownUsageEndpoint, usageByKeyEndpoint } from './usage.ts';

/** Every operation of the API, in the order of the documentation. */
export const ENDPOINTS: readonly Endpoint[] = [
  convertEndpoint,
  ratesEndpoint,
  verifyEndpoint,
  verifyRatesEndpoint,
  identifyEndpoint,
  resolveEndpoint,
  rigidBodyEndpoint,
  listRunsEndpoint,
  getRunJUnitEndpoint,
  getRunEndpoint,
  listConventionsEndpoint,
  getConventionEndpoint,
  listKeysEndpoint,
  issueKeyEndpoint,
  revokeKeyEndpoint,
  changeKeyLimitsEndpoint,
  listHistoryEndpoint,
  exportHistoryEndpoint,
  getHistorySettingsEndpoint,
  changeHistorySettingsEndpoint,
  getHistoryEntryEndpoint,
  ownUsageEndpoint,
  usageByKeyEndpoint,
  listLimitsEndpoint,
  changeLimitsEndpoint,
  signInEndpoint,
  currentSessionEndpoint,
  signOutEndpoint,
  healthEndpoint,
];
