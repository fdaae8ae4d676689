/** Guards that another site cannot write in the name of whoever is signed in here. */
import { describe, expect, it } from "vitest";
import { checkOrigin } from "@/lib/http/same-origin";

const BASE = "http://127.0.0.1:3000";

function ask(method: string, headers: Record<string, string>): () => void {
  const request = new Request(`${BASE}/api/projects`, { method, headers });
  return () => checkOrigin(request, BASE);
}

const WRITES = ["POST", "PUT", "PATCH", "DELETE"];

describe.each(WRITES)("%s", (method) => {
  it("is taken from a page of this site", () => {
    expect(ask(method, { origin: BASE })).not.toThrow();
    expect(ask(method, { origin: BASE, "sec-fetch-site": "same-origin" })).not.toThrow();
    expect(ask(method, { origin: "http://localhost:3000", host: "localhost:3000" })).not.toThrow();
  });

  it.each([
    {},
    { origin: "null" },
    { origin: "" },
    { origin: "https://elsewhere.example" },
    { origin: "http://127.0.0.1:3001" },
    { origin: "http://127.0.0.1:3000.elsewhere.example" },
    { origin: BASE, "sec-fetch-site": "cross-site" },
    { origin: BASE, "sec-fetch-site": "same-site" },
  ])("is refused with %j", (headers) => {
    expect(ask(method, headers as Record<string, string>)).toThrowError(
      expect.objectContaining({ code: "other_origin" }),
    );
  });
});

it("lets reading through, which changes nothing", () => {
  expect(ask("GET", { origin: "https://elsewhere.example" })).not.toThrow();
  expect(ask("HEAD", {})).not.toThrow();
});
