import { route } from '@/lib/auth/route';
import { noticeRead } from '@/lib/openapi/answers/notice';
import { readNotice } from '@/lib/services/notice/mark-read';

export const POST = route(readNotice, { params: { id: 'noticeId' }, scope: 'profile:write', doc: { summary: 'Mark a notice as read', answers: noticeRead } });
