import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { Stroke } from '@/lib/schemas/photo';
import type { Rulebook } from '@/lib/diagnose/types';
import type { CaseKit } from '@/lib/schemas/case-kit';
import type { Waiting } from '@/lib/schemas/waiting';

/** A photo on this device: until it is stored, the only copy there is. */
export interface DevicePhoto {
  id: string;
  personId: string;
  organisationId: string;
  caseId: string;
  checkId: string | null;
  /** The step of a repair, or the point of an install record, that it shows; photos from before there were any have none. */
  place?: string | null;
  /** Already turned upright, made smaller and rid of what the camera wrote into it. */
  picture: Blob;
  thumbnail: Blob;
  width: number;
  height: number;
  takenAt: string;
  clockOffsetMs: number;
  description: string;
  strokes: Stroke[];
  state: 'waiting' | 'stored' | 'refused';
  /** Why it was refused, in words. */
  problem: string | null;
}

export interface OfflineSchema extends DBSchema {
  /** Everything that waits to be sent, in the order in which it was done. */
  waiting: { key: number; value: Waiting; indexes: { case: string } };
  photo: { key: string; value: DevicePhoto; indexes: { case: string } };
  /** Editions are immutable. */
  edition: { key: string; value: { id: string; rulebook: Rulebook } };
  kit: { key: string; value: CaseKit };
  /** Who uses this device, and how far off its clock is. */
  device: { key: string; value: unknown };
}

export type OfflineDatabase = IDBPDatabase<OfflineSchema>;

export const OFFLINE_DATABASE = 'carryover';
const VERSION = 1;

let opened: Promise<OfflineDatabase> | undefined;

/** The device's own keep. Rejects where the browser has none (some private windows): the caller then says so. */
export function offlineDatabase(): Promise<OfflineDatabase> {
  opened ??= openDB<OfflineSchema>(OFFLINE_DATABASE, VERSION, {
    upgrade(db) {
      db.createObjectStore('waiting', { autoIncrement: true, keyPath: 'order' }).createIndex('case', 'caseId');
      db.createObjectStore('photo', { keyPath: 'id' }).createIndex('case', 'caseId');
      db.createObjectStore('edition', { keyPath: 'id' });
      db.createObjectStore('kit', { keyPath: 'caseId' });
      db.createObjectStore('device');
    },
    terminated() {
      opened = undefined;
    },
  }).catch((error: unknown) => {
    opened = undefined;
    throw error;
  });
  return opened;
}
