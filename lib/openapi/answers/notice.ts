import { z } from 'zod';
import { NOTICE_BY_MAIL, NOTICE_KINDS } from '@/lib/schemas/notice';
import { count, id, instant, list } from './common';

const place = z.string().nullable().meta({ description: 'The page of what happened; null when it has none.' });

export const noticeList = list(
  'notices',
  z.object({
    id,
    kind: z.enum(NOTICE_KINDS),
    sentence: z.string().meta({ description: 'What happened, in words.' }),
    caseId: id.nullable(),
    place,
    createdAt: instant,
    readAt: instant.nullable(),
  }),
).meta({ id: 'NoticeList' });

export const noticeRead = z.object({ id, place }).meta({ id: 'NoticeRead' });
export const noticesRead = z.object({ read: count.meta({ description: 'Those that were unread until now.' }) }).meta({ id: 'NoticesRead' });

const byMail = z.enum(NOTICE_BY_MAIL);
export const noticeChoices = z
  .object({ assigned: byMail, 'repair-assigned': byMail, comeback: byMail, 'watch-due': byMail, 'mail-bounced': byMail })
  .meta({ id: 'NoticeChoices' });
