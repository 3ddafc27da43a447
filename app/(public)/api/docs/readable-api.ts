import 'server-only';
import { ROUTES } from '@/app/api/v1/routes';
import { apiDocument } from '@/lib/openapi/document';
import { readable, type Readable } from '@/lib/openapi/readable';

let made: Readable | undefined;

/** The document for reading; it stays as it is while the process runs. */
export const readableApi = (): Readable => (made ??= readable(apiDocument(ROUTES)));
