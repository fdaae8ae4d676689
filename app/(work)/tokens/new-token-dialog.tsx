"use client";
import { useMutation, useQueryClient } from "@tanstack/react-query";
import { useId, useState, type FormEvent } from "react";
import { ApiProblem } from "@/lib/client/api-problem";
import { createTokenMutation } from "@/lib/client/mutations";
import { TOKEN_DAYS, type CreateAccessToken } from "@/lib/schemas/access-token";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { Field, SelectField, TextField } from "@/components/ui/field";

/** The key in a field of its own, to be copied; closing the dialog is the last that is seen of it. */
function ShownKey({ value, onClose }: { readonly value: string; readonly onClose: () => void }) {
  const [isCopied, setIsCopied] = useState(false);
  const copy = async () => {
    await navigator.clipboard.writeText(value);
    setIsCopied(true);
  };
  return (
    <Dialog
      title="Your new token"
      onClose={onClose}
      actions={
        <>
          <Button onClick={() => void copy()}>{isCopied ? "Copied" : "Copy"}</Button>
          <Button kind="primary" onClick={onClose}>
            I have kept it
          </Button>
        </>
      }
    >
      <Field
        label="Token"
        hint="Shown this once. Send it as the header Authorization: Bearer, then the token."
      >
        {(binding) => (
          <input
            {...binding}
            readOnly
            className="control w-full font-mono"
            value={value}
            onFocus={(event) => event.target.select()}
          />
        )}
      </Field>
      <p role="status" className="sr-only">
        {isCopied ? "The token is in the clipboard." : ""}
      </p>
    </Dialog>
  );
}

type Days = CreateAccessToken["days"];
const daysFrom = (text: string): Days => TOKEN_DAYS.find((days) => String(days) === text) ?? TOKEN_DAYS[0];

/** Asks what the token is for and for how long, then shows it once. */
export function NewTokenDialog({ onClose }: { readonly onClose: () => void }) {
  const formId = useId();
  const create = useMutation(createTokenMutation(useQueryClient()));
  const [name, setName] = useState("");
  const [days, setDays] = useState<Days>(90);
  if (create.data) return <ShownKey value={create.data.key} onClose={onClose} />;
  const problem = create.error instanceof ApiProblem ? create.error : null;
  const nameError = problem?.messageFor("name") ?? undefined;

  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (!create.isPending) create.mutate({ name, days });
  };
  return (
    <Dialog
      title="New access token"
      onClose={onClose}
      actions={
        <>
          <Button onClick={onClose}>Leave it</Button>
          <Button kind="primary" type="submit" form={formId} isBusy={create.isPending} busyLabel="Making it">
            Make the token
          </Button>
        </>
      }
    >
      <form id={formId} onSubmit={submit} noValidate className="grid gap-4">
        <TextField
          label="What it is for"
          hint="The program and where it runs."
          value={name}
          onChange={(event) => setName(event.target.value)}
          error={nameError}
          autoFocus
          maxLength={80}
        />
        <SelectField
          label="Ends after"
          value={String(days)}
          onChange={(event) => setDays(daysFrom(event.target.value))}
        >
          {TOKEN_DAYS.map((each) => (
            <option key={each} value={each}>{`${each} days`}</option>
          ))}
        </SelectField>
        {create.error && !nameError ? (
          <p role="alert" className="font-semibold text-fail">
            {create.error.message}
          </p>
        ) : null}
      </form>
    </Dialog>
  );
}
