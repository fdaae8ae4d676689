import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { HeaderLink, SiteHeader } from "@/components/layout/site-header";
import { THEME_COOKIE, themeFrom } from "@/components/layout/theme";
import { ThemeSwitch } from "@/components/layout/theme-switch";

/** The frame of the pages that anyone may read. */
export default async function PublicLayout({ children }: { readonly children: ReactNode }) {
  const theme = themeFrom((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <>
      <SiteHeader end={<ThemeSwitch initial={theme} />}>
        <HeaderLink href="/projects">Projects</HeaderLink>
        <HeaderLink href="/method">Method</HeaderLink>
        <HeaderLink href="/accessibility">Accessibility</HeaderLink>
      </SiteHeader>
      <main id="main" tabIndex={-1} className="outline-none">
        {children}
      </main>
    </>
  );
}
