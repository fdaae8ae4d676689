"use client";
import { useMutation, useQueryClient } from "@tanstack/react-query";
import { useRouter } from "next/navigation";
import { useId, useState, type FormEvent } from "react";
import { ApiProblem } from "@/lib/client/api-problem";
import { createProjectMutation } from "@/lib/client/mutations";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { Field, TextField } from "@/components/ui/field";

/** Asks for a name and opens the new project. What was typed stays when the server refuses. */
export function NewProjectDialog({ onClose }: { readonly onClose: () => void }) {
  const router = useRouter();
  const formId = useId();
  const create = useMutation(createProjectMutation(useQueryClient()));
  const [name, setName] = useState("");
  const [description, setDescription] = useState("");
  const problem = create.error instanceof ApiProblem ? create.error : null;
  const messageFor = (path: string) => problem?.messageFor(path) ?? undefined;
  const hasOwnField =
    problem?.fields.some((field) => field.path === "name" || field.path === "description") ?? false;

  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (create.isPending) return;
    create.mutate(description.trim() === "" ? { name } : { name, description }, {
      onSuccess: (project) => router.push(`/projects/${project.id}`),
    });
  };
  return (
    <Dialog
      title="New project"
      onClose={onClose}
      actions={
        <>
          <Button onClick={onClose}>Leave it</Button>
          <Button kind="primary" type="submit" form={formId} isBusy={create.isPending} busyLabel="Making it">
            Make the project
          </Button>
        </>
      }
    >
      <form id={formId} onSubmit={submit} noValidate className="grid gap-4">
        <TextField
          label="Name"
          value={name}
          onChange={(event) => setName(event.target.value)}
          error={messageFor("name")}
          autoFocus
          maxLength={200}
        />
        <Field
          label="Description"
          hint="What it is and where; may stay empty."
          error={messageFor("description")}
        >
          {(binding) => (
            <textarea
              {...binding}
              rows={3}
              className="control w-full"
              value={description}
              onChange={(event) => setDescription(event.target.value)}
            />
          )}
        </Field>
        {create.error && !hasOwnField ? (
          <p role="alert" className="font-semibold text-fail">
            {create.error.message}
          </p>
        ) : null}
      </form>
    </Dialog>
  );
}
