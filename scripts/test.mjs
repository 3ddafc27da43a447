import { requireNode } from './lib/node-version.mjs';

requireNode();
// Loaded afterwards, because an older Node may not even parse it.
import('./lib/test.mjs').then(({ testEverything }) => testEverything());
