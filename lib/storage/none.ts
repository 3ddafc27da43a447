import type { Storage } from './index';

const refuse = () => Promise.reject(new Error('There is no storage here.'));

/** For scripts and tests that touch no photos: fails when something does after all. */
export const noStorage: Storage = { put: refuse, get: refuse, open: refuse, head: refuse, remove: refuse, presignUpload: refuse, presignRead: refuse };
