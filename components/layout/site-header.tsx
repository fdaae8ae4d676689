import Link from "next/link";
import type { ReactNode } from "react";

export interface SiteHeaderProps {
  /** The links of the main navigation, in order. */
  readonly children?: ReactNode;
  /** Right end: person, theme, way out. */
  readonly end?: ReactNode;
}

/** The sheet's head rule: product name, navigation, person. */
export function SiteHeader({ children, end }: SiteHeaderProps) {
  return (
    <header className="no-print border-b-2 border-ink">
      <div className="header-line flex flex-wrap items-baseline gap-x-7 gap-y-2 px-5 pt-3.5 pb-[11px] desk:px-9">
        <Link
          href="/"
          className="text-[1.0625rem] font-[750] tracking-[-0.01em] text-ink no-underline [font-stretch:112%]"
        >
          Panelwright
        </Link>
        {children ? (
          <nav aria-label="Main" className="flex flex-wrap items-baseline gap-x-5 gap-y-1">
            {children}
          </nav>
        ) : null}
        <div className="ml-auto flex flex-wrap items-baseline gap-x-5 gap-y-1">{end}</div>
      </div>
    </header>
  );
}

export interface HeaderLinkProps {
  readonly href: string;
  readonly isHere?: boolean;
  readonly children: ReactNode;
}

/** One place of the navigation; the one you are at is underlined in petrol. */
export function HeaderLink({ href, isHere = false, children }: HeaderLinkProps) {
  return (
    <Link
      href={href}
      aria-current={isHere ? "page" : undefined}
      className={
        isHere
          ? "border-b-2 border-petrol pb-0.5 font-semibold text-ink"
          : "text-soft hover:text-ink hover:underline"
      }
    >
      {children}
    </Link>
  );
}
