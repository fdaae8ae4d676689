"use client";

import { useEffect } from "react";

/** Ctrl+S or Cmd+S saves; with null the browser keeps its own meaning of it. */
export function useSaveKey(save: (() => void) | null): void {
  useEffect(() => {
    if (save === null) return;
    const onKeyDown = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey || event.key.toLowerCase() !== "s") return;
      event.preventDefault();
      save();
    };
    window.addEventListener("keydown", onKeyDown);
    return () => window.removeEventListener("keydown", onKeyDown);
  }, [save]);
}
