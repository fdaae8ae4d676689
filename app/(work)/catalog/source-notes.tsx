/** The sources of a table's rows, each once, in the order they first appear: rows refer to them by number. */
export const sourcesOf = (rows: readonly { readonly source: string }[]): readonly string[] => [
  ...new Set(rows.map((row) => row.source)),
];

/** The numbered sources under a table. */
export function SourceNotes({ sources }: { readonly sources: readonly string[] }) {
  return (
    <ol aria-label="Sources" className="mt-2 grid list-decimal gap-1 pl-5 text-note text-soft">
      {sources.map((source) => (
        <li key={source}>{source}</li>
      ))}
    </ol>
  );
}
