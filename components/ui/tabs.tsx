"use client";
import { useId, useRef, type KeyboardEvent, type ReactNode } from "react";
import { joinClasses } from "./join-classes";

export interface TabItem<K extends string> {
  readonly key: K;
  readonly label: ReactNode;
}

export interface TabsProps<K extends string> {
  readonly label: string;
  readonly items: readonly TabItem<K>[];
  readonly selected: K;
  readonly onSelect: (key: K) => void;
  readonly children: ReactNode;
}

const MOVES: Record<string, number> = { ArrowRight: 1, ArrowLeft: -1 };

/** Tabs by the usual pattern: one Tab stop, arrows move and select, Home and End jump. */
export function Tabs<K extends string>({ label, items, selected, onSelect, children }: TabsProps<K>) {
  const base = useId();
  const list = useRef<HTMLDivElement>(null);
  const onKeyDown = (event: KeyboardEvent) => {
    const at = items.findIndex((item) => item.key === selected);
    const move = MOVES[event.key];
    const next =
      move !== undefined
        ? (at + move + items.length) % items.length
        : event.key === "Home"
          ? 0
          : event.key === "End"
            ? items.length - 1
            : null;
    const target = next === null ? undefined : items[next];
    if (!target) return;
    event.preventDefault();
    onSelect(target.key);
    list.current?.querySelector<HTMLElement>(`[data-tab="${target.key}"]`)?.focus();
  };
  return (
    <div>
      <div
        ref={list}
        role="tablist"
        aria-label={label}
        onKeyDown={onKeyDown}
        className="flex flex-wrap gap-6 border-b border-ink"
      >
        {items.map((item) => (
          <button
            key={item.key}
            type="button"
            role="tab"
            id={`${base}-${item.key}`}
            data-tab={item.key}
            aria-selected={item.key === selected}
            aria-controls={`${base}-panel`}
            tabIndex={item.key === selected ? 0 : -1}
            onClick={() => onSelect(item.key)}
            className={joinClasses(
              "-mb-px border-b-[3px] px-0.5 py-2",
              item.key === selected
                ? "border-petrol font-semibold text-ink"
                : "border-transparent text-soft hover:text-ink",
            )}
          >
            {item.label}
          </button>
        ))}
      </div>
      <div role="tabpanel" id={`${base}-panel`} aria-labelledby={`${base}-${selected}`} className="pt-4">
        {children}
      </div>
    </div>
  );
}
