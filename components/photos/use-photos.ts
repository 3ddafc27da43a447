'use client';

import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useMemo } from 'react';
import { listen } from '@/lib/offline/bus';
import type { DevicePhoto } from '@/lib/offline/database';
import { dropPhoto, photosHere } from '@/lib/offline/photos';
import { fetchPhotos } from '@/lib/offline/photos-list';
import { queryKeys } from '@/lib/query/keys';
import type { PhotoList } from '@/lib/schemas/photo';
import { shownPhotos, type ShownPhoto } from './shown';

interface Of {
  caseId: string;
  personId: string;
  /** As the page came with it. */
  initial: PhotoList;
  /** Photos are still taken and sent: not the past. */
  live: boolean;
}

/** The photos of a case, on the server and on this device, kept up to date. */
export function usePhotos({ caseId, personId, initial, live }: Of): { photos: ShownPhoto[]; refresh: () => Promise<void> } {
  const client = useQueryClient();
  const stored = useQuery({
    queryKey: queryKeys.casePhotos(caseId),
    queryFn: () => fetchPhotos(caseId),
    initialData: initial,
    // A page that was kept on the device is as old as its keeping.
    initialDataUpdatedAt: 0,
    networkMode: 'always',
    enabled: live,
  }).data;
  const { data: here = [] } = useQuery({
    queryKey: queryKeys.casePhotosHere(caseId),
    queryFn: async () => {
      const now = await photosHere({ caseId, personId }).catch(() => []);
      const before = client.getQueryData<DevicePhoto[]>(queryKeys.casePhotosHere(caseId)) ?? [];
      // Another tab drops what its own list has: here it stays in sight until this list has it, too.
      if (before.some(({ id }) => !now.some((photo) => photo.id === id))) await client.refetchQueries({ queryKey: queryKeys.casePhotos(caseId), exact: true });
      return now;
    },
    networkMode: 'always',
    enabled: live,
  });

  const refresh = useCallback(() => client.invalidateQueries({ queryKey: queryKeys.casePhotos(caseId) }), [client, caseId]);
  useEffect(
    () =>
      listen((told) => {
        if (told.caseId !== caseId) return;
        if (told.kind === 'photos-changed') void client.invalidateQueries({ queryKey: queryKeys.casePhotosHere(caseId) });
        // The case was written to, here or by somebody else.
        if (told.kind === 'kit-changed') void refresh();
      }),
    [client, caseId, refresh],
  );

  const photos = useMemo(() => shownPhotos(stored.photos, here), [stored, here]);
  useEffect(() => {
    const known = new Set(stored.photos.map(({ id }) => id));
    const sent = here.filter(({ state }) => state === 'stored');
    // The device's copy goes when the server shows its own, and not before.
    for (const photo of sent) if (known.has(photo.id)) void dropPhoto(photo);
    if (sent.some(({ id }) => !known.has(id))) void refresh();
  }, [stored, here, refresh]);
  return { photos, refresh };
}
