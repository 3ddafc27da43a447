import { selectModels } from '@/db/queries/compressor-model';
import { selectLimits } from '@/db/queries/limit';
import type { Transaction } from '@/db/connect';
import { PERMITTED } from '@/lib/auth/permissions';
import { measureOf } from '@/lib/case/view/measure';
import type { Check } from '@/lib/diagnose/types';
import { notFound } from '@/lib/errors';
import { CHECKS_WITH_FIGURES, limitOf, limitText, publishedFor } from '@/lib/limits';
import { pageOf } from '@/lib/schemas/browse';
import { dayText } from '@/lib/schemas/day-text';
import { browseLimitsInput, limitFormInput, limitIdInput } from '@/lib/schemas/limit';
import { formatQuantity, unitFor, type Quantity } from '@/lib/units';
import { z } from 'zod';
import type { Ctx } from '../context';
import { defineRead } from '../define';
import { measuredChecks } from './check-in-force';

/** Checks that figures are published for first, then the others by name. */
const inOrder = (checks: Check[]): Check[] => {
  const place = ({ id }: Check) => (CHECKS_WITH_FIGURES.includes(id) ? CHECKS_WITH_FIGURES.indexOf(id) : CHECKS_WITH_FIGURES.length);
  return [...checks].sort((a, b) => place(a) - place(b) || a.name.localeCompare(b.name));
};

/** Every measured check with the limits that stand for it. */
export const listLimits = defineRead({
  name: 'list.limit',
  doing: 'see limits',
  roles: PERMITTED['limit.see'],
  input: z.object({}),
  run: async ({ tx, ctx }) => {
    const checks = inOrder(await measuredChecks(tx, ctx.organisation.id));
    const limits = await shownLimits(tx, ctx, checks);
    return checks.map(({ id, name }) => ({ checkId: id, name, published: publishedFor(id).length, limits: limits.filter(({ checkId }) => checkId === id) }));
  },
});

export type CheckLimits = Awaited<ReturnType<typeof listLimits>>[number];

/** The limits that stand, one page after another. */
export const browseLimits = defineRead({
  name: 'browse.limit',
  doing: 'see limits',
  roles: PERMITTED['limit.see'],
  input: browseLimitsInput,
  run: async ({ tx, ctx, input }) => {
    const limits = await shownLimits(tx, ctx, await measuredChecks(tx, ctx.organisation.id));
    const { rows, next } = pageOf(limits, { ...input, keysOf: ({ adoptedAt, id }) => [adoptedAt, id] });
    return { limits: rows, next };
  },
});

export const viewLimit = defineRead({
  name: 'view.limit',
  doing: 'see limits',
  roles: PERMITTED['limit.see'],
  input: limitIdInput,
  run: async ({ tx, ctx, input: { limitId } }) => {
    const limit = (await shownLimits(tx, ctx, await measuredChecks(tx, ctx.organisation.id))).find(({ id }) => id === limitId);
    if (!limit) throw notFound('limit');
    return limit;
  },
});

async function shownLimits(tx: Transaction, ctx: Ctx, checks: readonly Check[]) {
  const named = new Map(checks.map((check) => [check.id, check]));
  const rows = await selectLimits(tx, { organisationId: ctx.organisation.id });
  return rows.map(({ adoptedAt, ...row }) => {
    const check = named.get(row.checkId);
    const measure = check && measureOf(check, ctx.person.units);
    return { ...row, adoptedAt: adoptedAt.toISOString(), checkName: check?.name ?? row.checkId, text: measure ? limitText(row, measure) : '' };
  });
}

/** What the form of a limit is opened with: the check, published figures to begin from, and the one that was chosen. */
export const readLimitForm = defineRead({
  name: 'read.limit-form',
  doing: 'adopt limits',
  roles: PERMITTED['limit.adopt'],
  input: limitFormInput,
  run: async ({ tx, ctx, input }) => {
    const organisationId = ctx.organisation.id;
    const checks = inOrder(await measuredChecks(tx, organisationId));
    const check = checks.find(({ id }) => id === input.check);
    const measure = check && measureOf(check, ctx.person.units);
    const figures = check ? publishedFor(check.id) : [];
    const chosen = figures.find(({ id }) => id === input.from);
    const { rows: models } = await selectModels(tx, { organisationId, hidden: false, sort: 'name', direction: 'asc', limit: 500, offset: 0 });
    // As its source writes it, less a unit that is printed beside the field anyway.
    const written = (si: number | undefined) => {
      if (si === undefined || !chosen) return '';
      const text = formatQuantity<Quantity>(si, { quantity: chosen.quantity, unit: chosen.like });
      return chosen.like === measure?.unit ? text.replace(/[^\d.]+$/, '') : text;
    };
    return {
      checks: checks.map(({ id, name }) => ({ id, name })),
      check: check && measure ? { id: check.id, name: check.name, quantity: measure.quantity, unit: measure.unit } : null,
      figures: figures.map((figure) => ({
        id: figure.id,
        what: figure.what,
        text: limitText(limitOf(figure), { quantity: figure.quantity, unit: unitFor(ctx.person.units, figure.quantity, figure.like) }),
        for: [figure.region ?? figure.country, figure.vehicle === 'any' ? null : figure.vehicle, figure.builtFrom && `built from ${dayText(figure.builtFrom)}`, figure.when].filter(Boolean).join(', '),
        source: `${limitOf(figure).source}${figure.fromMemory ? '; remembered, look it up' : ''}`,
      })),
      values: {
        least: written(chosen?.least),
        most: written(chosen?.most),
        below: chosen?.below ?? false,
        source: chosen ? limitOf(chosen).source : '',
        country: chosen?.country === 'United States' ? 'US' : chosen?.country === 'Canada' ? 'CA' : '',
        vehicleKind: chosen?.vehicle === 'bus' || chosen?.vehicle === 'truck' ? chosen.vehicle : '',
        builtFrom: chosen?.builtFrom ?? '',
      },
      models: models.map(({ id, name }) => ({ id, name })),
    };
  },
});
