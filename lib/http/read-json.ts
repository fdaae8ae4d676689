import { AppError } from "./app-error";

/** Largest body that a route reads, bytes. */
export const BODY_LIMIT_BYTES = 1_048_576;

const tooLarge = (): AppError =>
  new AppError("too_large", "The request is larger than 1 MB. Send fewer load cases or options.");

/** Reads no further than the limit, whatever the sender says the length is. */
async function readLimited(body: ReadableStream<Uint8Array>): Promise<string> {
  const decoder = new TextDecoder("utf-8", { fatal: true });
  const reader = body.getReader();
  let text = "";
  let bytes = 0;
  for (;;) {
    const { done, value } = await reader.read();
    if (done) return text + decoder.decode();
    bytes += value.byteLength;
    if (bytes > BODY_LIMIT_BYTES) {
      await reader.cancel();
      throw tooLarge();
    }
    text += decoder.decode(value, { stream: true });
  }
}

/**
 * The body as JSON.
 *
 * @throws AppError too_large above 1 MB, invalid when it is not JSON in UTF-8.
 */
export async function readJson(request: Request): Promise<unknown> {
  if (Number(request.headers.get("content-length") ?? 0) > BODY_LIMIT_BYTES) throw tooLarge();
  try {
    return JSON.parse(request.body === null ? "" : await readLimited(request.body)) as unknown;
  } catch (error) {
    if (error instanceof AppError) throw error;
    const message = "The body is not JSON.";
    throw new AppError("invalid", message, { fields: [{ path: "", message }] });
  }
}
