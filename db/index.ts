import 'server-only';
import { env } from '@/lib/env';
import { connect, type Connection } from './connect';

declare global {
  // The development server reloads modules; the pool must survive that, or connections pile up.
  var carryoverConnection: Connection | undefined;
}

/** The application's one pool. Only lib/auth takes it from here; everything else is handed a `ctx`. */
export const database = () => (globalThis.carryoverConnection ??= connect(env().DATABASE_URL)).db;
