import { route } from '@/lib/auth/route';
import { noticesRead } from '@/lib/openapi/answers/notice';
import { readAllNotices } from '@/lib/services/notice/mark-read';

export const POST = route(readAllNotices, { scope: 'profile:write', doc: { summary: 'Mark all your notices as read', answers: noticesRead } });
