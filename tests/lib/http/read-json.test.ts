/** Guards that a body is read up to 1 MB and no further, and that what is not JSON is said so. */
import { describe, expect, it } from "vitest";
import { BODY_LIMIT_BYTES, readJson } from "@/lib/http/read-json";

const post = (body: BodyInit | null, headers: Record<string, string> = {}): Request =>
  new Request("http://127.0.0.1/api", { method: "POST", body, headers, duplex: "half" } as RequestInit);

const textOf = (bytes: number): string => JSON.stringify("x".repeat(bytes - 2));

describe("the body of a request", () => {
  it("is read when it is JSON of up to 1 MB", async () => {
    expect(await readJson(post('{"a":[1,"λ̄"]}'))).toEqual({ a: [1, "λ̄"] });
    expect(await readJson(post(textOf(BODY_LIMIT_BYTES)))).toHaveLength(BODY_LIMIT_BYTES - 2);
  });

  it("is refused above 1 MB, whatever length it claims", async () => {
    const large = { code: "too_large" };
    await expect(readJson(post(textOf(BODY_LIMIT_BYTES + 1)))).rejects.toMatchObject(large);
    await expect(readJson(post("{}", { "content-length": "99999999" }))).rejects.toMatchObject(large);
  });

  it("is not read to the end when it never ends", async () => {
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        sent += 65_536;
        controller.enqueue(new Uint8Array(65_536).fill(0x20));
      },
    });
    await expect(readJson(post(endless))).rejects.toMatchObject({ code: "too_large" });
    expect(sent).toBeLessThan(2 * BODY_LIMIT_BYTES);
  });

  it.each([null, "", "{", "not json", "{'a':1}"])("is refused as no JSON: %j", async (body) => {
    await expect(readJson(post(body))).rejects.toMatchObject({ code: "invalid", fields: [{ path: "" }] });
  });

  it("is refused when it is not UTF-8", async () => {
    await expect(readJson(post(new Uint8Array([0x22, 0xff, 0x22])))).rejects.toMatchObject({
      code: "invalid",
    });
  });
});
