import { route } from '@/lib/auth/route';
import { noticeList } from '@/lib/openapi/answers/notice';
import { browseNotices } from '@/lib/services/notice/list';

export const GET = route(browseNotices, { scope: 'profile:read', doc: { summary: 'List your notices', description: 'What you were told: work that was given to you, repairs that did not hold, readings that are due, mail that could not be delivered. The newest first.', answers: noticeList } });
