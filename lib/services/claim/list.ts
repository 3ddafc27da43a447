import { selectCaseHead } from '@/db/queries/case';
import { selectClaims, selectCores } from '@/db/queries/claim';
import { selectFitsOfUnit } from '@/db/queries/fit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { CLAIM_STATES, CORE_STATES, claimsOfCaseInput, type ClaimsView, type ClaimState, type CoreState } from '@/lib/schemas/claim';
import { dayText } from '@/lib/schemas/day-text';
import { defineRead } from '../define';

/** What was claimed for a case, and what went back for its core. */
export const listClaims = defineRead({
  name: 'list.claim',
  doing: 'see claims',
  roles: PERMITTED['case.see'],
  input: claimsOfCaseInput,
  run: async ({ tx, ctx, input: { caseId } }): Promise<ClaimsView> => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const head = await selectCaseHead(tx, of);
    if (!head) throw notFound('case');
    const fits = (await selectFitsOfUnit(tx, { ...of, unitId: head.unitId })).map(({ id, modelName, installedOn }) => ({ id, name: `${modelName}, fitted ${dayText(installedOn)}` }));
    return {
      caseId,
      currency: ctx.organisation.currency,
      claims: (await selectClaims(tx, of)).map((row) => ({ ...row, state: stateOf(CLAIM_STATES, row.state) })),
      cores: (await selectCores(tx, of)).map((row) => ({ ...row, state: stateOf(CORE_STATES, row.state), fit: fits.find(({ id }) => id === row.fitId)?.name ?? null })),
      fits,
    };
  },
});

function stateOf<State extends ClaimState | CoreState>(states: Readonly<Record<State, string>>, text: string): State {
  const state = (Object.keys(states) as State[]).find((known) => known === text);
  if (state === undefined) throw new Error(`a claim is ${text}`);
  return state;
}
