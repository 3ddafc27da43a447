/** The default rulebook: data, one file a station, assembled. What the figures rest on: `docs/default-rulebook.md`. */
import type { Rulebook } from '../types';
import { causes } from './causes';
import { cautions } from './cautions';
import { checks as crankcaseAndDrainChecks } from './checks/crankcase-and-drain';
import { checks as cylinderAndHeadChecks } from './checks/cylinder-and-head';
import { checks as dischargeLineChecks } from './checks/discharge-line';
import { checks as driveChecks } from './checks/drive';
import { checks as dryerChecks } from './checks/dryer';
import { checks as intakeChecks } from './checks/intake';
import { checks as oilFeedChecks } from './checks/oil-feed';
import { checks as releaseChecks } from './checks/release';
import { checks as tanksAndSystemChecks } from './checks/tanks-and-system';
import { checks as unloaderAndGovernorChecks } from './checks/unloader-and-governor';
import { checks as vehicleAndHistoryChecks } from './checks/vehicle-and-history';
import { evidenceGroups } from './evidence-groups';
import { panels } from './panels';
import { proof } from './proof';
import { remedies } from './remedies';
import { rules as compoundRules } from './rules/compound';
import { rules as crankcaseAndDrainRules } from './rules/crankcase-and-drain';
import { rules as cylinderAndHeadRules } from './rules/cylinder-and-head';
import { rules as dischargeLineRules } from './rules/discharge-line';
import { rules as driveRules } from './rules/drive';
import { rules as dryerRules } from './rules/dryer';
import { rules as intakeRules } from './rules/intake';
import { rules as oilFeedRules } from './rules/oil-feed';
import { rules as tanksAndSystemRules } from './rules/tanks-and-system';
import { rules as unloaderAndGovernorRules } from './rules/unloader-and-governor';
import { rules as vehicleAndHistoryRules } from './rules/vehicle-and-history';
import { settings } from './settings';

export const defaultRulebook: Rulebook = {
  schemaVersion: 1,
  title: 'Default rulebook',
  settings,
  causes,
  checks: [
    ...vehicleAndHistoryChecks,
    ...intakeChecks,
    ...cylinderAndHeadChecks,
    ...dischargeLineChecks,
    ...dryerChecks,
    ...tanksAndSystemChecks,
    ...oilFeedChecks,
    ...crankcaseAndDrainChecks,
    ...driveChecks,
    ...unloaderAndGovernorChecks,
    ...releaseChecks,
  ],
  panels,
  evidenceGroups,
  rules: [
    ...vehicleAndHistoryRules,
    ...intakeRules,
    ...cylinderAndHeadRules,
    ...dischargeLineRules,
    ...dryerRules,
    ...tanksAndSystemRules,
    ...oilFeedRules,
    ...crankcaseAndDrainRules,
    ...driveRules,
    ...unloaderAndGovernorRules,
    ...compoundRules,
  ],
  remedies,
  cautions,
  proof,
};
