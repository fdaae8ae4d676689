import { AppError } from "./app-error";

const READING = new Set(["GET", "HEAD", "OPTIONS"]);

/** The host that the browser asked for. */
function hostOf(request: Request): string {
  return request.headers.get("host") ?? new URL(request.url).host;
}

function isOwnOrigin(origin: string, request: Request, baseUrl: string | undefined): boolean {
  if (!URL.canParse(origin)) return false;
  const given = new URL(origin);
  return (
    given.host === hostOf(request) || (baseUrl !== undefined && given.origin === new URL(baseUrl).origin)
  );
}

/**
 * A write must come from a page of this site. Browsers send Origin with every write; a request without
 * one comes from a program, which sends the header too: that is one line, and the rule has no hole.
 *
 * @throws AppError other_origin
 */
export function checkOrigin(request: Request, baseUrl: string | undefined): void {
  if (READING.has(request.method)) return;
  const origin = request.headers.get("origin");
  const site = request.headers.get("sec-fetch-site");
  const isFine =
    origin !== null && isOwnOrigin(origin, request, baseUrl) && (site === null || site === "same-origin");
  if (!isFine) {
    throw new AppError(
      "other_origin",
      "Changes are taken only from the pages of this site: send its address as Origin.",
    );
  }
}
