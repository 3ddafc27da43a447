import type { DossierHeadRow, selectSendings } from '@/db/queries/dossier';
import { DOSSIER_STATES, MAIL_STATES, PAPERS, type DossierRowView, type Paper, type SendingView } from '@/lib/schemas/dossier';

type Sending = Awaited<ReturnType<typeof selectSendings>>[number];

/** The database keeps text; what it holds is one of ours. */
function oneOf<Word extends string>(words: readonly Word[], text: string): Word {
  const word = words.find((known) => known === text);
  if (word === undefined) throw new Error(`“${text}” is none of ${words.join(', ')}`);
  return word;
}

export const asPaper = (text: string): Paper => oneOf(PAPERS, text);

export const dossierRowView = ({ madeAt, paper, state, ...row }: DossierHeadRow, sendings: readonly Sending[]): DossierRowView => ({
  ...row,
  madeAt: madeAt.toISOString(),
  paper: oneOf(PAPERS, paper),
  state: oneOf(DOSSIER_STATES, state),
  sendings: sendings.filter(({ dossierId }) => dossierId === row.id).map(sendingView),
});

const sendingView = ({ id, to, words, sentBy, at, state, error, sentAt }: Sending): SendingView => ({
  id,
  to,
  words,
  sentBy,
  at: at.toISOString(),
  state: oneOf(MAIL_STATES, state),
  error,
  sentAt: sentAt?.toISOString() ?? null,
});
