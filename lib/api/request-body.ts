import { AppError } from '@/lib/errors';

/** Far above any sample or plan, far below what would hurt. */
export const MOST_BODY_BYTES = 256 * 1024;

/**
 * The JSON of a request. Throws `unsupportedType` for another type or a compressed body (nothing is unpacked, so nothing
 * can be a bomb), `tooLarge` beyond the limit whatever length was announced, `badInput` for what is no JSON.
 */
export async function readJsonBody(request: Request): Promise<unknown> {
  const type = request.headers.get('content-type')?.split(';')[0]?.trim().toLowerCase();
  if (type !== 'application/json') {
    throw new AppError('unsupportedType', 'Send the body as application/json.');
  }
  if (request.headers.has('content-encoding')) {
    throw new AppError('unsupportedType', 'Send the body uncompressed.');
  }
  const text = await readLimited(request.body);
  try {
    return JSON.parse(text) as unknown;
  } catch {
    throw new AppError('badInput', 'The body is not JSON.');
  }
}

async function readLimited(stream: ReadableStream<Uint8Array> | null): Promise<string> {
  if (stream === null) return '';
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  const reader = stream.getReader();
  for (let read = await reader.read(); !read.done; read = await reader.read()) {
    bytes += read.value.byteLength;
    if (bytes > MOST_BODY_BYTES) {
      await reader.cancel();
      throw new AppError('tooLarge', `A body has at most ${MOST_BODY_BYTES} bytes.`);
    }
    chunks.push(read.value);
  }
  return Buffer.concat(chunks).toString('utf8');
}
