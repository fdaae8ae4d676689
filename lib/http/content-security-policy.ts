/**
 * What a page may load: its own files, and scripts and style sheets that carry the nonce of this reply.
 * Development needs eval for the reloading of modules, and a socket for their news.
 */
export function contentSecurityPolicy(
  nonce: string,
  { isDevelopment }: { readonly isDevelopment: boolean },
): string {
  const rules: readonly (readonly [string, string])[] = [
    ["default-src", "'self'"],
    ["script-src", `'self' 'nonce-${nonce}' 'strict-dynamic'${isDevelopment ? " 'unsafe-eval'" : ""}`],
    ["style-src", `'self' 'nonce-${nonce}'`],
    ["img-src", "'self' data: blob:"],
    ["font-src", "'self'"],
    ["connect-src", `'self'${isDevelopment ? " ws:" : ""}`],
    ["form-action", "'self'"],
    ["base-uri", "'self'"],
    ["object-src", "'none'"],
    ["frame-ancestors", "'none'"],
  ];
  return rules.map(([name, value]) => `${name} ${value}`).join("; ");
}
