import { type NextRequest, NextResponse } from "next/server";
import { PATH_HEADER } from "@/lib/auth/path-header";
import { readSessionToken, sessionCookieName } from "@/lib/auth/session-cookie";
import { environment } from "@/lib/config/env";
import { contentSecurityPolicy } from "@/lib/http/content-security-policy";

/** Pages that need no session. */
const OPEN_PAGES = ["/sign-in", "/method", "/accessibility"];

const isOpen = (path: string): boolean =>
  OPEN_PAGES.some((page) => path === page || path.startsWith(`${page}/`));

/**
 * For pages only: sends whoever has no session cookie of ours to sign in, and sets the content security
 * policy. This is a courtesy, not the guard: every page and every route asks for the session itself.
 */
export async function proxy(request: NextRequest): Promise<NextResponse> {
  const { authSecret, baseUrl, isProduction } = environment();
  const { pathname, search } = request.nextUrl;
  const cookie = request.cookies.get(sessionCookieName(baseUrl))?.value;
  if (!isOpen(pathname) && (await readSessionToken(cookie, authSecret)) === null) {
    const signIn = request.nextUrl.clone();
    signIn.pathname = "/sign-in";
    signIn.search = `?callbackUrl=${encodeURIComponent(pathname + search)}`;
    return NextResponse.redirect(signIn);
  }
  const nonce = Buffer.from(crypto.randomUUID()).toString("base64");
  const policy = contentSecurityPolicy(nonce, { isDevelopment: !isProduction });
  // Next reads the nonce from the policy on the request.
  const headers = new Headers(request.headers);
  headers.set("content-security-policy", policy);
  headers.set("x-nonce", nonce);
  headers.set(PATH_HEADER, pathname + search);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set("content-security-policy", policy);
  response.headers.set("referrer-policy", "same-origin");
  response.headers.set("x-content-type-options", "nosniff");
  return response;
}

export const config = {
  // Not the API, which guards itself, and not files, whose names have a dot.
  matcher: ["/((?!api/|_next/|.*\\..*).*)"],
};
