import type { selectRemovalsOfCase, selectStoredOfCase } from '@/db/queries/attachment';
import type { PhotoView } from '@/lib/schemas/photo';

type Row = Awaited<ReturnType<typeof selectStoredOfCase>>[number];
type Removal = Awaited<ReturnType<typeof selectRemovalsOfCase>>[number];

/** A stored photo as pages and scripts see it. */
export function photoView({ caseId, width, height, takenAt, createdAt, description, ...row }: Row, removal: Removal | undefined): PhotoView {
  return {
    ...row,
    caseId: caseId ?? '',
    width: width ?? 0,
    height: height ?? 0,
    takenAt: (takenAt ?? createdAt).toISOString(),
    description: description ?? '',
    hidden: removal?.kind === 'hide' ? { reason: removal.reason, person: removal.person, at: removal.at.toISOString() } : null,
  };
}
