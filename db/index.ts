import 'server-only';
import { env } from '@/lib/env';
import { caseChanges, type CaseChanges } from './changes';
import { connect, type Connection } from './connect';

declare global {
  // The development server reloads modules; what is open must survive that, or connections pile up.
  var carryoverConnection: Connection | undefined;
  var carryoverChanges: CaseChanges | undefined;
}

/** The application's one pool. Only lib/auth takes it from here; everything else is handed a `ctx`. */
export const database = () => (globalThis.carryoverConnection ??= connect(env().DATABASE_URL)).db;

/** Its one ear for what other processes write. */
export const changes = () => (globalThis.carryoverChanges ??= caseChanges(env().DATABASE_URL));
