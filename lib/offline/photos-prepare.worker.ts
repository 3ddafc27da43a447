import { keepBuiltFiles } from './keep-pages';
import { PhotoProblem, preparePhoto } from './photos-prepare';
import type { PhotoMade, PhotoWanted } from './photos-worker';

self.onmessage = async ({ data: { id, file } }: MessageEvent<PhotoWanted>) => {
  const answer = (made: PhotoMade['made']) => self.postMessage({ id, made } satisfies PhotoMade);
  try {
    answer({ ok: true, ...(await preparePhoto(file)) });
  } catch (error) {
    answer({ ok: false, why: error instanceof PhotoProblem ? error.message : null });
  }
};

// Where the service worker finds them, which the development server has none of.
if (process.env.NODE_ENV === 'production') void keepBuiltFiles([self.location.href]).catch(() => undefined);
