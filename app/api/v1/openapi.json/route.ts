import { apiDocument } from '@/lib/openapi/document';
import { ROUTES } from '../routes';

let text: string | undefined;

/** The description of the API, for anybody: it says nothing that the code doesn't. */
export function GET(): Response {
  text ??= JSON.stringify(apiDocument(ROUTES));
  return new Response(text, { headers: { 'content-type': 'application/json', 'cache-control': 'public, max-age=300' } });
}
