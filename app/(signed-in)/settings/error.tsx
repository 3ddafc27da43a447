'use client';

/** Under the navigation of the settings, so that it stays. */
export { default } from '../error';
