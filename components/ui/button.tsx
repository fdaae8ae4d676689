import Link from "next/link";
import type { ComponentProps, ReactNode } from "react";
import { joinClasses } from "./join-classes";

export type ButtonKind = "primary" | "plain" | "quiet" | "danger";

const KINDS: Record<ButtonKind, string> = {
  primary:
    "bg-petrol text-onpetrol border-petrol font-semibold hover:bg-ink hover:border-ink hover:text-paper",
  plain: "bg-sheet text-ink border-rule2 hover:border-ink",
  quiet: "bg-transparent text-petrol border-transparent hover:border-rule2",
  danger: "bg-sheet text-fail border-fail font-semibold hover:bg-failwash",
};
const BASE =
  "inline-flex min-h-9 items-center justify-center gap-2 border px-3.5 py-1.5 text-body whitespace-nowrap no-underline disabled:cursor-not-allowed disabled:border-rule disabled:bg-paper disabled:text-soft aria-disabled:text-soft";

export interface ButtonProps extends ComponentProps<"button"> {
  readonly kind?: ButtonKind;
  /** While true the button stays in place, tells that it works, and takes no second press. */
  readonly isBusy?: boolean;
  readonly busyLabel?: string;
}

/** A button. The default type is "button", so that one inside a form does not send it by accident. */
export function Button({
  kind = "plain",
  isBusy = false,
  busyLabel,
  className,
  children,
  type = "button",
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={type}
      // Not `disabled` while busy: that would throw keyboard focus back to the top of the page.
      aria-disabled={isBusy || undefined}
      onClick={(event) => {
        if (isBusy) event.preventDefault();
        else onClick?.(event);
      }}
      className={joinClasses(BASE, KINDS[kind], className)}
    >
      {isBusy && busyLabel ? busyLabel : children}
    </button>
  );
}

export interface ButtonLinkProps {
  readonly href: string;
  readonly kind?: ButtonKind;
  readonly className?: string;
  readonly children: ReactNode;
}

/** A link that leads to another page and looks like a button. */
export function ButtonLink({ href, kind = "plain", className, children }: ButtonLinkProps) {
  return (
    <Link href={href} className={joinClasses(BASE, KINDS[kind], className)}>
      {children}
    </Link>
  );
}

/** Buttons, links and selects that belong together, joined into one ruled strip. */
export function ToolStrip({ label, children }: { readonly label: string; readonly children: ReactNode }) {
  return (
    <div
      role="group"
      aria-label={label}
      className="no-print flex flex-wrap *:-ml-px *:focus-visible:z-10 [&>*]:relative pl-px"
    >
      {children}
    </div>
  );
}
