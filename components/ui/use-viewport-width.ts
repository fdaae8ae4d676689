"use client";
import { useEffect } from "react";

/**
 * Publishes the width of the window without its scroll bar as `--viewport`, for what stays in place
 * while a wide sheet is moved sideways. CSS has no length that leaves the scroll bar out.
 */
export function useViewportWidth() {
  useEffect(() => {
    const root = document.documentElement;
    const publish = () => root.style.setProperty("--viewport", `${root.clientWidth}px`);
    publish();
    window.addEventListener("resize", publish);
    return () => {
      window.removeEventListener("resize", publish);
      root.style.removeProperty("--viewport");
    };
  }, []);
}
