import { AppError, invalid } from '@/lib/errors';

/** As much as any request of ours needs, many times over; files don't come this way. */
export const MOST_BYTES = 256 * 1024;

const tooLarge = () => new AppError('too-large', `A request may hold ${MOST_BYTES / 1024} KiB at most.`);

/** Reads a body and stops where it gets too long, whatever its header said. */
export async function limitedText(request: Request, most = MOST_BYTES): Promise<string> {
  if (Number(request.headers.get('content-length')) > most) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  for await (const chunk of request.body ?? []) {
    bytes += chunk.byteLength;
    if (bytes > most) throw tooLarge();
    chunks.push(chunk);
  }
  return new TextDecoder().decode(Buffer.concat(chunks));
}

/** The body of a write, which is JSON or nothing. */
export async function jsonBody(request: Request): Promise<unknown> {
  const text = await limitedText(request);
  if (text === '') return {};
  if (!/^application\/([\w.-]+\+)?json\b/i.test(request.headers.get('content-type') ?? '')) {
    throw invalid({}, 'Send the body as JSON, with the content type application/json.');
  }
  return parsedJson(text);
}

/** @throws MalformedBody */
export function parsedJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch (error) {
    throw new MalformedBody(error);
  }
}

/** Not even JSON: 400, where a body that can be read but not used is 422. */
export class MalformedBody extends AppError {
  constructor(cause: unknown) {
    super('invalid', 'The body of the request is not JSON.', {}, { cause });
  }
}
