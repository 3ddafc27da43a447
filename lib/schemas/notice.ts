import { z } from 'zod';
import { browseCasesInput, cursorOf } from './browse';
import { pageNumber, rowId } from './common';

/** What people are told of, in the order in which they choose how. */
export const NOTICE_KINDS = ['assigned', 'repair-assigned', 'comeback', 'watch-due', 'mail-bounced'] as const;
export type NoticeKind = (typeof NOTICE_KINDS)[number];

export const NOTICE_BY_MAIL = ['at-once', 'daily', 'never'] as const;
export type NoticeByMail = (typeof NOTICE_BY_MAIL)[number];

/** By kind; what is left out is as usual. */
export type NoticeChoices = Partial<Record<NoticeKind, NoticeByMail>>;

/** How each goes by mail until its reader says otherwise. */
export const USUAL_BY_MAIL: Readonly<Record<NoticeKind, NoticeByMail>> = {
  assigned: 'at-once',
  'repair-assigned': 'at-once',
  comeback: 'at-once',
  'watch-due': 'daily',
  'mail-bounced': 'at-once',
};

/** What a sentence needs beside the case: ids, and words that name no person. */
export interface NoticeAbout {
  /** Id of the person who did it. */
  by?: string | null;
  /** What it is about: a remedy, a reading of the watch, the subject of a mail. */
  what?: string;
}

const choice = (kind: NoticeKind) => z.enum(NOTICE_BY_MAIL, 'Choose one from the list.').default(USUAL_BY_MAIL[kind]);

export const setNoticesInput = z.strictObject({
  assigned: choice('assigned'),
  'repair-assigned': choice('repair-assigned'),
  comeback: choice('comeback'),
  'watch-due': choice('watch-due'),
  'mail-bounced': choice('mail-bounced'),
});

/** The page; nonsense in its address is as if it weren't there. */
export const listNoticesInput = z.object({ page: pageNumber.default(1) });

export const browseNoticesInput = z.strictObject({
  unread: z.enum(['yes', 'no']).default('no').transform((text) => text === 'yes').meta({ description: 'Those not read yet alone.' }),
  limit: browseCasesInput.shape.limit,
  cursor: cursorOf([z.iso.datetime(), rowId]),
});

export const noticeInput = z.strictObject({ noticeId: rowId });
