import { requireNode } from './lib/node-version.mjs';

requireNode();
// Loaded afterwards, because an older Node may not even parse it.
import('./lib/reset-demo.mjs').then(({ resetDemo }) => resetDemo());
