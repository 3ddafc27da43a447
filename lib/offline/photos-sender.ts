import { ApiProblem, mayPass } from '@/lib/query/problem';
import { readConnection } from './connection';
import { changePhoto, photoHere, unsentPhotos } from './photos';
import { sendPhoto } from './photos-send';
import { startSendLoop } from './send-loop';

const LONGEST_PAUSE_MS = 30_000;

/** Sends the photos that wait, one after another; of all tabs only one at a time. */
export const startPhotoSender = (person: { personId: string; organisationId: string }): { stop: () => void } =>
  startSendLoop({
    lock: 'carryover-photos',
    wakes: 'photos-changed',
    longestPauseMs: LONGEST_PAUSE_MS,
    async sendAll({ stopped, progressed }) {
      let all = true;
      for (const id of await unsentPhotos(person)) {
        const photo = stopped() ? undefined : await photoHere(id);
        if (photo?.state !== 'waiting') continue;
        try {
          await sendPhoto(photo);
          progressed();
        } catch (error) {
          if (!(error instanceof ApiProblem)) throw error;
          if (mayPass(error)) all = false;
          else await changePhoto(id, () => ({ state: 'refused', problem: error.message }));
          // One that the storage won't take must not keep back the others; without a connection none of them goes.
          if (!readConnection().reachable || readConnection().signedOut) return false;
        }
      }
      return all;
    },
  });
