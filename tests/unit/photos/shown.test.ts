import { describe, expect, test } from 'vitest';
import { shownPhotos, standingOf } from '@/components/photos/shown';
import type { DevicePhoto } from '@/lib/offline/database';
import type { PhotoView } from '@/lib/schemas/photo';

const stored = (id: string, takenAt: string): PhotoView => ({
  id, takenAt, caseId: 'case', checkId: null, place: null, width: 4, height: 3, person: 'Ada', description: '', strokes: [], hidden: null,
});
const here = (id: string, takenAt: string, more: Partial<DevicePhoto> = {}): DevicePhoto => ({
  id, takenAt, personId: 'person', organisationId: 'organisation', caseId: 'case', checkId: null, width: 4, height: 3,
  picture: new Blob(), thumbnail: new Blob(), clockOffsetMs: 0, description: '', strokes: [], state: 'waiting', problem: null, ...more,
});

describe('what the strip shows', () => {
  test('is what is stored and what waits here, as it was taken', () => {
    const shown = shownPhotos([stored('b', '2026-03-02T10:00:00Z'), stored('d', '2026-03-02T12:00:00Z')], [here('c', '2026-03-02T11:00:00Z'), here('a', '2026-03-02T09:00:00Z')]);
    expect(shown.map(({ id }) => id)).toEqual(['a', 'b', 'c', 'd']);
  });

  test('never shows a photo twice: once it is stored, the server’s counts', () => {
    const shown = shownPhotos([stored('a', '2026-03-02T10:00:00Z')], [here('a', '2026-03-02T10:00:00Z', { state: 'stored' })]);
    expect(shown).toHaveLength(1);
    expect(shown[0]?.here).toBeNull();
  });
});

test('says where a photo stands, and nothing of one that is stored', () => {
  const said = (more: Partial<DevicePhoto>, share?: number) => shownPhotos([], [here('a', '2026-03-02T10:00:00Z', more)]).map((photo) => standingOf(photo, share));
  expect(said({})).toEqual(['Waits']);
  expect(said({}, 0.404)).toEqual(['Being sent, 40 %']);
  expect(said({ state: 'refused', problem: 'This is no picture.' })).toEqual(['Refused: This is no picture.']);
  expect(said({ state: 'stored' })).toEqual([null]);
});
