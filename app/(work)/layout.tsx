import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { AppHeader } from "@/components/layout/app-header";
import { THEME_COOKIE, themeFrom } from "@/components/layout/theme";
import { requireActor } from "@/lib/auth/require-actor";

/** Draws the head of the signed-in pages. It guards nothing: each page asks for its actor itself. */
export default async function WorkLayout({ children }: { readonly children: ReactNode }) {
  const actor = await requireActor();
  const theme = themeFrom((await cookies()).get(THEME_COOKIE)?.value);
  return (
    // As wide as its widest sheet, so that the head rule reaches across a comparison of many options.
    <div className="w-fit min-w-full">
      <AppHeader person={{ name: actor.name, role: actor.role }} theme={theme} />
      <main id="main" tabIndex={-1} className="outline-none">
        {children}
      </main>
    </div>
  );
}
