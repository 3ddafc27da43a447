import { route } from '@/lib/auth/route';
import { noticeChoices } from '@/lib/openapi/answers/notice';
import { nothing } from '@/lib/openapi/answers/record';
import { readNoticeChoices, setNotices } from '@/lib/services/notice/choices';

export const GET = route(readNoticeChoices, { scope: 'profile:read', doc: { summary: 'Read how you are told', description: 'By mail, kind by kind; in the app every notice stands.', answers: noticeChoices } });

export const PUT = route(setNotices, {
  scope: 'profile:write',
  input: ({ body }) => body,
  shape: () => ({}),
  doc: { summary: 'Choose how you are told', description: 'By kind: at once, with the mail of the day, or in the app alone. Kinds left out are as usual.', answers: nothing },
});
