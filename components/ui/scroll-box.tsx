"use client";
import { useEffect, useRef, type ReactNode } from "react";

/** Holds something that may be wider than its place. It becomes a Tab stop only when it really has to be moved. */
export function ScrollBox({ label, children }: { readonly label: string; readonly children: ReactNode }) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const element = box.current;
    if (!element || typeof ResizeObserver === "undefined") return;
    const observer = new ResizeObserver(() => {
      if (element.scrollWidth > element.clientWidth) element.tabIndex = 0;
      else element.removeAttribute("tabindex");
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return (
    <div ref={box} role="group" aria-label={label} className="min-w-0 overflow-x-auto">
      {children}
    </div>
  );
}
