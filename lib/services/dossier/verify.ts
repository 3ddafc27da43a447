import { findDossier } from '@/db/queries/dossier';
import { verifyDossierInput } from '@/lib/schemas/dossier';
import { tryOrRefuse } from '../session/tries';
import { defineVisit } from '../visit';

/**
 * Says to anybody whether a dossier with this reference and hash was made here, and when; nothing else. The hash may be
 * that of its content, as it is printed, or that of its file.
 */
export const verifyDossier = defineVisit({
  input: verifyDossierInput,
  run: async ({ visitor, input }): Promise<{ found: 'content' | 'pdf'; madeAt: string } | { found: null }> => {
    await tryOrRefuse(visitor, 'dossier by network', visitor.network);
    const dossier = await findDossier(visitor.db, input);
    return dossier ? { found: dossier.kind, madeAt: dossier.madeAt.toISOString() } : { found: null };
  },
});
