import type { Remedy } from '../../types';
import { remedies as crankcaseAndDrain } from './crankcase-and-drain';
import { remedies as cylinderAndHead } from './cylinder-and-head';
import { remedies as dischargeLine } from './discharge-line';
import { remedies as drive } from './drive';
import { remedies as dryer } from './dryer';
import { remedies as intake } from './intake';
import { remedies as noPart } from './no-part';
import { remedies as oilFeed } from './oil-feed';
import { remedies as tanksAndSystem } from './tanks-and-system';
import { remedies as unloaderAndGovernor } from './unloader-and-governor';

export const remedies: Remedy[] = [
  ...intake,
  ...cylinderAndHead,
  ...dischargeLine,
  ...dryer,
  ...tanksAndSystem,
  ...oilFeed,
  ...crankcaseAndDrain,
  ...drive,
  ...unloaderAndGovernor,
  ...noPart,
];
