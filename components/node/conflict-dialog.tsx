"use client";

import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import type { SavedDocument } from "@/lib/schemas/node";
import { differencesOf } from "./draft-differences";
import { draftOf, type DraftObject, type DraftValue } from "./node-draft";
import { pathWords } from "./path-words";

export interface ConflictDialogProps {
  readonly message: string;
  readonly opened: DraftObject;
  readonly mine: DraftObject;
  readonly theirs: SavedDocument;
  readonly onKeepMine: () => void;
  readonly onTakeTheirs: () => void;
  readonly onClose: () => void;
}

/** A value of the document in a few words. */
function valueWords(value: DraftValue | undefined): string {
  if (value === undefined || value === "") return "left out";
  if (typeof value === "object" && value !== null) {
    const text = JSON.stringify(value);
    return text.length > 70 ? `${text.slice(0, 67)}…` : text;
  }
  return String(value);
}

/** A moment as people write it, in the reader's own time. */
export const momentWords = (iso: string): string =>
  new Intl.DateTimeFormat("en-GB", {
    day: "numeric",
    month: "short",
    hour: "2-digit",
    minute: "2-digit",
  }).format(new Date(iso));

/** Somebody saved first: what they changed, what I changed, and three ways on. Nothing is lost in any of them. */
export function ConflictDialog({
  message,
  opened,
  mine,
  theirs,
  onKeepMine,
  onTakeTheirs,
  onClose,
}: ConflictDialogProps) {
  const differences = differencesOf(opened, mine, draftOf(theirs.document));
  return (
    <Dialog
      title="Somebody saved this node first"
      shape="panel"
      onClose={onClose}
      actions={
        <>
          <Button onClick={onTakeTheirs}>Take theirs, set mine aside</Button>
          <Button kind="primary" onClick={onKeepMine}>
            Lay my changes on top of theirs
          </Button>
        </>
      }
    >
      <p>{message}</p>
      <p className="mt-2">
        {`${theirs.savedBy.name} saved version ${theirs.version} on ${momentWords(theirs.savedAt)}. Nothing of yours was saved, and nothing of it is lost.`}
      </p>
      {differences.length === 0 ? (
        <p className="mt-3">Both versions say the same.</p>
      ) : (
        <table className="mt-4 w-full border-collapse text-label">
          <caption className="sr-only">Fields that differ</caption>
          <thead>
            <tr className="border-b border-ink text-left">
              <th scope="col" className="py-1 pr-3 font-[650]">
                Field
              </th>
              <th scope="col" className="pr-3 font-[650]">
                as opened
              </th>
              <th scope="col" className="pr-3 font-[650]">
                mine
              </th>
              <th scope="col" className="font-[650]">
                {theirs.savedBy.name}
              </th>
            </tr>
          </thead>
          <tbody>
            {differences.map((difference) => {
              const [was, my, their] = [difference.opened, difference.mine, difference.theirs].map(
                valueWords,
              );
              return (
                <tr key={difference.path} className="border-t border-rule align-top">
                  <th scope="row" className="py-1 pr-3 text-left font-normal">
                    {pathWords(difference.path)}
                  </th>
                  <td className="pr-3 text-soft">{was}</td>
                  <td className={`pr-3 ${my === was ? "text-soft" : "font-[650]"}`}>{my}</td>
                  <td className={their === was ? "text-soft" : "font-[650]"}>{their}</td>
                </tr>
              );
            })}
          </tbody>
        </table>
      )}
      <p className="mt-3 text-note text-soft">
        Where both changed the same field, yours stands when you lay it on top. You look the result over and
        save it yourself.
      </p>
    </Dialog>
  );
}
