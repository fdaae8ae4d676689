/** The first thing Tab reaches: past the header, to the page itself. */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="fixed top-2 left-2 z-50 -translate-y-24 border-2 border-ink bg-sheet px-4 py-2 font-semibold text-ink focus:translate-y-0"
    >
      Skip to the page
    </a>
  );
}
