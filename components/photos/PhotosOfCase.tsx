'use client';

import { createContext, use, useEffect, useMemo, type ReactNode } from 'react';
import { keepBuiltFiles } from '@/lib/offline/keep-pages';
import { warmPhotoWorker } from '@/lib/offline/photos-worker';
import type { CaseView } from '@/lib/schemas/case-view';
import type { PhotoList } from '@/lib/schemas/photo';
import { loadDialog } from './load-dialog';
import type { ShownPhoto } from './shown';
import { usePhotos } from './use-photos';

interface CasePhotos {
  caseId: string;
  reader: CaseView['reader'];
  timeZone: string;
  checkName: (checkId: string) => string;
  photos: readonly ShownPhoto[];
  refresh: () => Promise<void>;
  readOnly: boolean;
}

const Photos = createContext<CasePhotos | null>(null);

/** The photos of the case that is on the page; null where there is none. */
export const useCasePhotos = () => use(Photos);

/** After the page has come to rest: what taking and looking at photos needs is then on the device. */
const FETCH_AFTER_MS = 4_000;

/** Around the page of a case: every `PhotoStrip` below shares its photos. */
export function PhotosOfCase({ view, initial, children }: { view: CaseView; initial: PhotoList; children: ReactNode }) {
  const { reader, head, rulebook, state } = view;
  const { caseId, at } = state;
  const { photos, refresh } = usePhotos({ caseId, personId: reader.personId, initial, live: at === null });
  useEffect(() => {
    const timer = setTimeout(() => {
      warmPhotoWorker();
      void loadDialog()
        .then(() => (process.env.NODE_ENV === 'production' ? keepBuiltFiles() : undefined))
        .catch(() => undefined);
    }, FETCH_AFTER_MS);
    return () => clearTimeout(timer);
  }, []);
  const value = useMemo<CasePhotos>(
    () => ({
      caseId,
      reader,
      timeZone: head.timeZone,
      checkName: (checkId) => rulebook.checks[checkId]?.name ?? checkId,
      photos: at === null ? photos : photos.filter(({ takenAt }) => takenAt <= at),
      refresh,
      readOnly: at !== null,
    }),
    [caseId, reader, head.timeZone, rulebook, photos, refresh, at],
  );
  return <Photos value={value}>{children}</Photos>;
}
