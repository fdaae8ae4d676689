"use client";

import { useEffect, useRef, useState } from "react";
import type { Dimension, Extent } from "@/lib/drawing/drawing";

interface DimensionEditorProps {
  readonly dimension: Dimension;
  readonly extent: Extent;
  readonly onCommit: (path: string, text: string, refocus: boolean) => void;
  readonly onCancel: () => void;
}

/** The input that stands on the drawing where the dimension's text was. It exists only after a click, so its place is set from the browser. */
export function DimensionEditor({ dimension, extent, onCommit, onCancel }: DimensionEditorProps) {
  const [text, setText] = useState(String(Math.round(dimension.valueMm * 10) / 10));
  const inputRef = useRef<HTMLInputElement>(null);
  const boxRef = useRef<HTMLDivElement>(null);
  const settled = useRef(false);
  const path = dimension.edits ?? "";

  useEffect(() => {
    const box = boxRef.current;
    if (box) {
      const across = (dimension.textAt.x - extent.minX) / (extent.maxX - extent.minX);
      const down = (dimension.textAt.y - extent.minY) / (extent.maxY - extent.minY);
      box.style.left = `${Math.min(92, Math.max(8, across * 100))}%`;
      box.style.top = `${down * 100}%`;
    }
  }, [dimension, extent]);

  // Once only: the drawing is made anew while somebody types, and a second select would swallow what they typed.
  useEffect(() => {
    inputRef.current?.focus();
    inputRef.current?.select();
  }, []);

  const settle = (finish: () => void) => {
    if (settled.current) return;
    settled.current = true;
    finish();
  };
  const unchanged = text.trim() === String(Math.round(dimension.valueMm * 10) / 10);
  const keep = (refocus: boolean) => settle(() => (unchanged ? onCancel() : onCommit(path, text, refocus)));

  return (
    <div
      ref={boxRef}
      className="absolute z-10 flex -translate-x-1/2 -translate-y-2/3 items-center gap-1 border border-petrol bg-sheet px-1"
    >
      <input
        ref={inputRef}
        aria-label={`${dimension.name} (mm)`}
        inputMode="decimal"
        autoComplete="off"
        className="w-16 bg-sheet py-0.5 text-right text-label text-ink outline-none"
        value={text}
        onChange={(event) => setText(event.target.value)}
        onKeyDown={(event) => {
          if (event.key === "Enter") {
            event.preventDefault();
            keep(true);
          } else if (event.key === "Escape") {
            event.preventDefault();
            event.stopPropagation();
            settle(onCancel);
          }
        }}
        onBlur={() => settle(() => (unchanged ? onCancel() : onCommit(path, text, false)))}
      />
      <span className="text-note text-soft">mm</span>
    </div>
  );
}
