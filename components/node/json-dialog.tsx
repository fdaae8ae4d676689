"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { isDraftObject, type DraftObject, type DraftValue } from "./node-draft";

export interface JsonDialogProps {
  /** The node as it is typed. */
  readonly document: unknown;
  readonly fileName: string;
  readonly readOnly: boolean;
  readonly onImport: (draft: DraftObject) => void;
  readonly onClose: () => void;
}

function read(text: string): { readonly draft: DraftObject } | { readonly fault: string } {
  try {
    const value = JSON.parse(text) as DraftValue;
    if (!isDraftObject(value))
      return { fault: "This is no node: a node document starts with { and ends with }." };
    // A request or result carries its node inside.
    return { draft: isDraftObject(value.node) ? value.node : value };
  } catch (error) {
    return {
      fault: `This is not JSON yet: ${error instanceof Error ? error.message : "it cannot be read"}.`,
    };
  }
}

function download(text: string, fileName: string): void {
  const address = URL.createObjectURL(new Blob([text], { type: "application/json" }));
  const link = document.createElement("a");
  link.href = address;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(address);
}

/** The node document as text: to copy, to keep as a file, or to paste another one over the form. */
export function JsonDialog({ document, fileName, readOnly, onImport, onClose }: JsonDialogProps) {
  const [text, setText] = useState(() => `${JSON.stringify(document, null, 2)}\n`);
  const [said, setSaid] = useState<{ readonly words: string; readonly isFault: boolean } | null>(null);
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(text);
      setSaid({ words: "Copied.", isFault: false });
    } catch {
      setSaid({ words: "The browser did not allow copying; select the text instead.", isFault: true });
    }
  };
  const take = () => {
    const result = read(text);
    if ("fault" in result) setSaid({ words: result.fault, isFault: true });
    else onImport(result.draft);
  };
  return (
    <Dialog
      title="The node as JSON"
      shape="panel"
      onClose={onClose}
      actions={
        <>
          <Button onClick={() => download(text, fileName)}>Save as a file</Button>
          <Button onClick={() => void copy()}>Copy</Button>
          {readOnly ? null : (
            <Button kind="primary" onClick={take}>
              Put this text into the form
            </Button>
          )}
        </>
      }
    >
      <p className="text-soft">
        The same document that uploads, the API and the command line use. Lengths in mm, forces in kN, moments
        in kNm.
        {readOnly ? "" : " Paste another node here; faults then stand beside the fields of the form."}
      </p>
      <textarea
        aria-label="Node document"
        aria-invalid={said?.isFault ? true : undefined}
        value={text}
        readOnly={readOnly}
        spellCheck={false}
        onChange={(event) => setText(event.target.value)}
        className="control mt-3 h-[60vh] w-full resize-y font-mono text-label"
      />
      {said ? (
        <p
          role={said.isFault ? "alert" : "status"}
          className={`mt-2 font-semibold ${said.isFault ? "text-fail" : "text-pass"}`}
        >
          {said.words}
        </p>
      ) : null}
    </Dialog>
  );
}
