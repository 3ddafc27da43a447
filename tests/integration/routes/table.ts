import type { Feature } from './row';
import { api } from './rows/api';
import { bench } from './rows/bench';
import { cases } from './rows/cases';
import { watches } from './rows/watches';
import { catches } from './rows/catches';
import { claims } from './rows/claims';
import { device } from './rows/device';
import { dossiers } from './rows/dossiers';
import { gates } from './rows/gates';
import { jobs } from './rows/jobs';
import { limits } from './rows/limits';
import { models } from './rows/models';
import { notices } from './rows/notices';
import { photos } from './rows/photos';
import { fittings } from './rows/fittings';
import { repairs } from './rows/repairs';
import { search } from './rows/search';
import { settings } from './rows/settings';
import { signingIn } from './rows/signing-in';
import { tokens } from './rows/tokens';
import { units } from './rows/units';

/**
 * Every page, server action and route handler there is, with who may use it and how. `routes.test.ts` fails when one in
 * `app` is not here, and tries wrong roles, another organisation, malformed and oversized input on each. A feature adds
 * its file of rows to `rows/` and its name here.
 */
export const FEATURES: readonly Feature[] = [signingIn, api, bench, cases, catches, device, photos, units, limits, models, search, jobs, repairs, fittings, settings, tokens, claims, dossiers, notices, watches, gates];
