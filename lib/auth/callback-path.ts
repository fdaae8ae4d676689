/** Where somebody lands who came without a wish. */
export const HOME_PATH = "/projects";

/**
 * A path of this site to go to after signing in, or the home path when the text could lead elsewhere:
 * another scheme or host, `//host`, a backslash that browsers read as a slash, control characters.
 */
export function safeCallbackPath(wish: string | null | undefined, ownOrigin?: string): string {
  if (wish === null || wish === undefined || wish === "") return HOME_PATH;
  const path =
    ownOrigin !== undefined && wish.startsWith(`${ownOrigin}/`) ? wish.slice(ownOrigin.length) : wish;
  const canLeadElsewhere = !path.startsWith("/") || path.startsWith("//") || /\\|\p{Cc}/u.test(path);
  if (canLeadElsewhere) return HOME_PATH;
  const landed = new URL(path, "http://own.invalid");
  // Taking out `/..` may leave two slashes at the front: `/..//host`.
  const isHere = landed.origin === "http://own.invalid" && !landed.pathname.startsWith("//");
  return isHere ? `${landed.pathname}${landed.search}${landed.hash}` : HOME_PATH;
}
