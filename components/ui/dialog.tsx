"use client";
import { useEffect, useId, useRef, type KeyboardEvent, type ReactNode } from "react";
import { Button } from "./button";
import { joinClasses } from "./join-classes";

const FOCUSABLE =
  'a[href],button:not([disabled]),input:not([disabled]),select:not([disabled]),textarea:not([disabled]),summary,[tabindex]:not([tabindex="-1"])';

export interface DialogProps {
  readonly title: ReactNode;
  /** Called for Escape, the close button and a press outside. The owner takes the dialog away. */
  readonly onClose: () => void;
  /** "panel" stands at the right edge over the full height; "box" in the middle. */
  readonly shape?: "panel" | "box";
  readonly children: ReactNode;
  /** Buttons at the foot. */
  readonly actions?: ReactNode;
}

/** Things inside a closed fold take no focus. Where the browser cannot tell, they count as shown. */
const isShown = (item: HTMLElement): boolean =>
  typeof item.checkVisibility === "function" ? item.checkVisibility() : true;

/** Keeps Tab inside the element. */
function keepTabInside(event: KeyboardEvent<HTMLElement>) {
  if (event.key !== "Tab") return;
  const all = [...event.currentTarget.querySelectorAll<HTMLElement>(FOCUSABLE)].filter(isShown);
  const first = all[0];
  const last = all[all.length - 1];
  if (!first || !last) return;
  if (event.shiftKey && document.activeElement === first) {
    event.preventDefault();
    last.focus();
  } else if (!event.shiftKey && document.activeElement === last) {
    event.preventDefault();
    first.focus();
  }
}

/**
 * A modal dialog on the native element: the rest of the page is inert, Tab stays inside, Escape
 * closes, and focus returns to where it was when the dialog opened. Render it only while it is open.
 */
export function Dialog({ title, onClose, shape = "box", children, actions }: DialogProps) {
  const ref = useRef<HTMLDialogElement>(null);
  const titleId = useId();

  useEffect(() => {
    const dialog = ref.current;
    const before = document.activeElement;
    if (dialog && !dialog.open) dialog.showModal();
    return () => {
      dialog?.close();
      if (before instanceof HTMLElement && before.isConnected) before.focus();
    };
  }, []);

  return (
    <dialog
      ref={ref}
      aria-labelledby={titleId}
      onKeyDown={(event) => {
        keepTabInside(event);
        if (event.key !== "Escape") return;
        event.preventDefault();
        event.stopPropagation();
        onClose();
      }}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      onClick={(event) => {
        if (event.target === event.currentTarget) onClose();
      }}
      className={joinClasses(
        "m-0 bg-sheet p-0 text-ink backdrop:bg-[rgb(10_16_20/0.45)]",
        shape === "panel"
          ? "fixed inset-y-0 right-0 left-auto h-dvh max-h-none w-[min(54rem,94vw)] max-w-none border-l-2 border-ink"
          : "fixed top-[12vh] right-0 left-0 mx-auto max-h-[76vh] w-[min(34rem,92vw)] border-2 border-ink",
      )}
    >
      <div className={joinClasses("flex flex-col", shape === "panel" ? "h-full" : "max-h-[76vh]")}>
        <div className="flex items-start justify-between gap-6 border-b border-ink px-6 py-4">
          <h2 id={titleId} tabIndex={-1}>
            {title}
          </h2>
          <Button kind="plain" onClick={onClose} className="no-print -my-1 min-h-8">
            Close
          </Button>
        </div>
        <div className="min-h-0 flex-1 overflow-y-auto px-6 py-4" tabIndex={-1}>
          {children}
        </div>
        {actions ? (
          <div className="flex flex-wrap justify-end gap-2 border-t border-rule px-6 py-4">{actions}</div>
        ) : null}
      </div>
    </dialog>
  );
}

export interface ConfirmDialogProps {
  readonly title: string;
  readonly children: ReactNode;
  readonly confirmLabel: string;
  readonly isBusy?: boolean;
  readonly error?: string | undefined;
  readonly onConfirm: () => void;
  readonly onClose: () => void;
}

/** Asks before something that cannot be taken back. */
export function ConfirmDialog({
  title,
  children,
  confirmLabel,
  isBusy = false,
  error,
  onConfirm,
  onClose,
}: ConfirmDialogProps) {
  return (
    <Dialog
      title={title}
      onClose={onClose}
      actions={
        <>
          <Button onClick={onClose}>Keep it</Button>
          <Button kind="danger" isBusy={isBusy} busyLabel="Working" onClick={onConfirm}>
            {confirmLabel}
          </Button>
        </>
      }
    >
      {children}
      {error ? (
        <p role="alert" className="mt-3 font-semibold text-fail">
          {error}
        </p>
      ) : null}
    </Dialog>
  );
}
