import type { Metadata, Viewport } from "next";
import localFont from "next/font/local";
import { cookies, headers } from "next/headers";
import type { ReactNode } from "react";
import { SkipLink } from "@/components/layout/skip-link";
import { THEME_COOKIE, themeFrom } from "@/components/layout/theme";
import "./globals.css";
import { Providers } from "./providers";

/* Archivo with its width and weight axes, shipped with the application (SIL Open Font License). */
const archivo = localFont({
  src: "../node_modules/@fontsource-variable/archivo/files/archivo-latin-standard-normal.woff2",
  variable: "--font-archivo",
  weight: "100 900",
  display: "swap",
  adjustFontFallback: false,
  declarations: [{ prop: "font-stretch", value: "62% 125%" }],
});
const archivoExtended = localFont({
  src: "../node_modules/@fontsource-variable/archivo/files/archivo-latin-ext-standard-normal.woff2",
  variable: "--font-archivo-ext",
  weight: "100 900",
  display: "swap",
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: "font-stretch", value: "62% 125%" }],
});

export const metadata: Metadata = {
  title: { default: "Panelwright", template: "%s · Panelwright" },
  icons: { icon: "/icon.svg" },
  description:
    "Compare ways to stiffen the column panel at a beam-to-column moment node: strength, stiffness, hours and cost side by side.",
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  colorScheme: "light dark",
};

/** The frame of every page: language, fonts, theme. Draws no header; each group of pages has its own. */
export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  // Reading the request makes every page dynamic, which the per-request script nonce of the content policy needs.
  await headers();
  const theme = themeFrom((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <html
      lang="en"
      className={`${archivo.variable} ${archivoExtended.variable}`}
      data-theme={theme === "system" ? undefined : theme}
      // The theme switch sets the attribute in the browser; the server's copy may be a page older.
      suppressHydrationWarning
    >
      <body className="min-h-dvh bg-paper text-body text-ink antialiased">
        <SkipLink />
        <Providers>{children}</Providers>
      </body>
    </html>
  );
}
