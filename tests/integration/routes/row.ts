import type { Role } from '@/lib/auth/roles';
import type { Ctx } from '@/lib/services/context';
import type { Tenant } from '@/tests/support/tenant';

/** Ids and secrets of what a feature's `prepare` made, by name. */
export type Made = Readonly<Record<string, string>>;

export type FormFields = Record<string, string | string[]>;
export type Query = Record<string, string | string[] | undefined>;

interface Common {
  /** Who may; 'anybody' means without signing in as well. */
  roles: readonly Role[] | 'anybody';
}

/** A page, by its folder below `app`. */
export interface PageRow<M extends Made> extends Common {
  page: string;
  params?: (made: M) => Record<string, string>;
  query?: (made: M) => Query;
  /** It never renders and goes there instead. */
  redirectsTo?: string;
}

/** A server action, by its file below `app` without `/actions.ts`, and its name. */
export interface ActionRow<M extends Made> extends Common {
  action: string;
  name: string;
  form: (made: M) => FormFields;
  /** It looks at no field, so that none can be wrong. */
  takesNothing?: boolean;
  /** It ends the session, so that somebody of its own does it. */
  endsSession?: boolean;
  /** It is a form's plain action, which answers by going somewhere else. */
  isPlain?: boolean;
}

/** A method of a route handler, by its folder below `app`. */
export interface RouteRow<M extends Made> extends Common {
  route: string;
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  params?: (made: M) => Record<string, string | string[]>;
  query?: (made: M) => Record<string, string>;
  body?: (made: M) => Record<string, unknown>;
  headers?: () => Record<string, string>;
}

export type Row<M extends Made = Made> = PageRow<M> | ActionRow<M> | RouteRow<M>;

/** What `prepare` has at hand: the organisation, and a context for any role in it. */
export interface Workshop {
  tenant: Tenant;
  as: (role: Role) => Ctx;
  /** The password of everybody here. */
  password: string;
}

export interface Feature<M extends Made = Made> {
  /**
   * Makes what the rows name, in the organisation given. It runs anew for each write that must succeed, so that one
   * row's write does not spoil another's. An id of it that a row names is also tried from another organisation.
   */
  prepare: (workshop: Workshop) => Promise<M>;
  rows: readonly Row<M>[];
}

/** Keeps `prepare` and `rows` to the same names. */
export const feature = <M extends Made>(given: Feature<M>): Feature => given as unknown as Feature;

export const nameOf = (row: Row): string =>
  'page' in row ? `page ${row.page}` : 'action' in row ? `action ${row.action} ${row.name}` : `${row.method} ${row.route}`;
