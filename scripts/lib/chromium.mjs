import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';

/** The browser for end-to-end tests, or nothing when this machine has none. */
export const findChromium = () =>
  ['chromium', 'chromium-browser', 'google-chrome']
    .flatMap((name) => ['/usr/bin', ...(process.env.PATH ?? '').split(delimiter)].map((folder) => join(folder, name)))
    .find((path) => existsSync(path));

/** What to say when there is none, for apt to put right. */
export const chromiumWanted = {
  packageName: 'chromium',
  missing: 'Chromium, which the end-to-end tests drive, is not on this machine.',
  elsewhere: "Install it with this system's package manager so that it is found as chromium.",
};
