import type { z } from 'zod';
import { asTenant, type Transaction } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { hasAnyRole, type Role } from '@/lib/auth/roles';
import { forbidden, invalid } from '@/lib/errors';
import type { Ctx } from './context';
import { fieldErrors } from './field-errors';
import { onceForKey } from './repeat';
import { refuseUnkeepable } from './unkeepable';

export interface Work<Input, Prepared = undefined> {
  tx: Transaction;
  ctx: Ctx;
  input: Input;
  /** What `prepare` came to. */
  prepared: Prepared;
  /** Notes what was written; the row goes in with the write or not at all. */
  audit: (row: { entity: string; entityId: string; changed: Record<string, unknown> }) => void;
  /** Says that nothing was written after all: a repeated request whose first copy had arrived. */
  unchanged: () => void;
}

interface Definition<Schema extends z.ZodType, Result, Prepared> {
  /** "open.case": verb and entity; the audit's action. */
  name: string;
  /** "open a case": completes "Your role does not allow you to …". */
  doing: string;
  roles: readonly Role[];
  input: Schema;
  /** Before the transaction: what is slow and needs none, or must stay when the transaction doesn't. */
  prepare?: (work: { ctx: Ctx; input: z.output<Schema> }) => Promise<Prepared>;
  run: (work: Work<z.output<Schema>, Prepared>) => Promise<Result>;
}

export interface Service<Schema extends z.ZodType, Result> {
  readonly action: string;
  readonly roles: readonly Role[];
  readonly input: Schema;
  (args: { ctx: Ctx; input: z.input<Schema> }): Promise<Result>;
}

/**
 * A write: role, parse, transaction, work, audit row in the same transaction, in this order and for every one of
 * them. A write that notes nothing in the audit is a mistake of ours and is rolled back.
 */
export const defineWrite = <Schema extends z.ZodType, Result, Prepared = undefined>(definition: Definition<Schema, Result, Prepared>) =>
  define(definition, true);

/** A read: role, parse, transaction with the organisation set. */
export const defineRead = <Schema extends z.ZodType, Result, Prepared = undefined>(definition: Definition<Schema, Result, Prepared>) =>
  define(definition, false);

function define<Schema extends z.ZodType, Result, Prepared>(
  { name, doing, roles, input: schema, prepare, run }: Definition<Schema, Result, Prepared>,
  writes: boolean,
): Service<Schema, Result> {
  const service = async ({ ctx, input }: { ctx: Ctx; input: z.input<Schema> }) => {
    if (!hasAnyRole(ctx.roles, roles)) throw forbidden(doing);
    refuseUnkeepable(input);
    const parsed = schema.safeParse(input);
    if (!parsed.success) throw invalid(fieldErrors(parsed.error));
    // Without a `prepare` nothing is prepared, and its type is undefined.
    const prepared = (await prepare?.({ ctx, input: parsed.data })) as Prepared;

    return asTenant(ctx.db, { organisationId: ctx.organisation.id, personId: ctx.person.id }, async (tx) => {
      const work = () => withAudit(tx, ctx, { name, writes }, (noting) => run({ tx, ctx, input: parsed.data, prepared, ...noting }));
      return writes ? onceForKey(tx, ctx, { name, input: parsed.data }, work) : work();
    });
  };
  // A function's own name can't be assigned to, so that the service's is `action`.
  return Object.assign(service, { action: name, roles, input: schema });
}

type Noting = Pick<Work<unknown>, 'audit' | 'unchanged'>;

/** Does the work of a service and puts its audit rows beside it. */
async function withAudit<Result>(tx: Transaction, ctx: Ctx, { name, writes }: { name: string; writes: boolean }, work: (noting: Noting) => Promise<Result>): Promise<Result> {
  const noted: Parameters<Noting['audit']>[0][] = [];
  let isUnchanged = false;
  const result = await work({ audit: (row) => noted.push(row), unchanged: () => (isUnchanged = true) });
  if (writes && noted.length === 0 && !isUnchanged) throw new Error(`${name} wrote without an audit row`);
  await insertAudit(tx, noted.map((row) => ({ ...row, organisationId: ctx.organisation.id, personId: ctx.person.id, action: name, at: ctx.now() })));
  return result;
}
