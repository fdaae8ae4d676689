"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { deleteNodeMutation } from "@/lib/client/mutations";
import { projectNodesOptions, projectOptions } from "@/lib/client/queries";
import { NODE_STATES, type NodeRow } from "@/lib/schemas/node";
import type { Project } from "@/lib/schemas/project";
import { PageBody, PageHead } from "@/components/layout/page-head";
import { Button, ButtonLink, ToolStrip } from "@/components/ui/button";
import { ConfirmDialog } from "@/components/ui/dialog";
import { SelectField, TextField } from "@/components/ui/field";
import { Empty, Failed, Loading } from "@/components/ui/states";
import { registerRows, STATE_WORDS, type RegisterFilter, type Sorting, type SortKey } from "./register-rows";
import { RegisterTable } from "./register-table";

function DeleteNode({ row, onClose }: { readonly row: NodeRow; readonly onClose: () => void }) {
  const remove = useMutation(deleteNodeMutation(useQueryClient(), row.id));
  return (
    <ConfirmDialog
      title={`Delete node ${row.reference}?`}
      confirmLabel="Delete the node"
      isBusy={remove.isPending}
      error={remove.error?.message}
      onConfirm={() => remove.mutate({ expectedVersion: row.version }, { onSuccess: onClose })}
      onClose={onClose}
    >
      <p>{`It leaves the register with its comparison. Its ${row.version === 1 ? "revision stays" : `${row.version} revisions stay`} on record.`}</p>
    </ConfirmDialog>
  );
}

const NO_FILTER: RegisterFilter = { words: "", state: "all" };

function FilterLine({
  filter,
  onChange,
  shown,
  total,
}: {
  readonly filter: RegisterFilter;
  readonly onChange: (filter: RegisterFilter) => void;
  readonly shown: number;
  readonly total: number;
}) {
  return (
    <form
      role="search"
      aria-label="Filter the register"
      className="no-print mb-3 flex flex-wrap items-end gap-3"
      onSubmit={(event) => event.preventDefault()}
    >
      <TextField
        label="Find"
        type="search"
        placeholder="Mark, section or option"
        value={filter.words}
        onChange={(event) => onChange({ ...filter, words: event.target.value })}
        fieldClassName="w-64"
      />
      <SelectField
        label="State"
        value={filter.state}
        onChange={(event) =>
          onChange({ ...filter, state: NODE_STATES.find((state) => state === event.target.value) ?? "all" })
        }
      >
        <option value="all">All</option>
        {NODE_STATES.map((state) => (
          <option key={state} value={state}>
            {STATE_WORDS[state]}
          </option>
        ))}
      </SelectField>
      <p role="status" className="pb-2 text-soft">
        {shown === total ? `${total} ${total === 1 ? "node" : "nodes"}` : `${shown} of ${total} nodes`}
      </p>
    </form>
  );
}

function Ready({
  project,
  rows,
  moneyUnit,
}: {
  readonly project: Project;
  readonly rows: readonly NodeRow[];
  readonly moneyUnit: string;
}) {
  const [filter, setFilter] = useState(NO_FILTER);
  const [sorting, setSorting] = useState<Sorting>({ key: "mark", direction: "ascending" });
  const [doomed, setDoomed] = useState<NodeRow | null>(null);
  const shown = registerRows(rows, filter, sorting);
  const sort = (key: SortKey) =>
    setSorting((now) => ({
      key,
      direction: now.key === key && now.direction === "ascending" ? "descending" : "ascending",
    }));
  return (
    <>
      <FilterLine filter={filter} onChange={setFilter} shown={shown.length} total={rows.length} />
      {shown.length === 0 ? (
        <Empty
          title="No node matches"
          actions={<Button onClick={() => setFilter(NO_FILTER)}>Show all</Button>}
        />
      ) : (
        <RegisterTable
          projectId={project.id}
          rows={shown}
          sorting={sorting}
          onSort={sort}
          moneyUnit={moneyUnit}
          onDelete={project.abilities.editNodes ? setDoomed : null}
        />
      )}
      {doomed ? <DeleteNode row={doomed} onClose={() => setDoomed(null)} /> : null}
    </>
  );
}

/** What the register says in a sentence. */
function summary(rows: readonly NodeRow[]): string {
  const count = (state: NodeRow["state"]) => rows.filter((row) => row.state === state).length;
  const bare = count("bare-passes");
  const parts = [
    [count("solved"), "solved"],
    [bare, bare === 1 ? "needs no stiffening" : "need no stiffening"],
    [count("nothing-passes"), "where nothing passes"],
    [count("outside-scope"), "outside scope"],
    [count("not-compared"), "not compared yet"],
  ] as const;
  return parts
    .filter(([number]) => number > 0)
    .map(([number, words]) => `${number} ${words}`)
    .join(", ");
}

/** The register of a project in its four states. */
export function NodeRegister({ projectId }: { readonly projectId: string }) {
  const project = useQuery(projectOptions(projectId));
  const nodes = useQuery(projectNodesOptions(projectId));
  const retry = () => void Promise.all([project.refetch(), nodes.refetch()]);
  const error = project.error ?? nodes.error;
  if (error) {
    return (
      <PageBody>
        <div className="pt-6">
          <Failed title="The register could not be read." error={error} onRetry={retry} />
        </div>
      </PageBody>
    );
  }
  if (!project.data || !nodes.data) {
    return (
      <PageBody>
        <div className="pt-6">
          <Loading what="the register" />
        </div>
      </PageBody>
    );
  }
  const { editNodes } = project.data.abilities;
  const newNode = editNodes ? (
    <ButtonLink kind="primary" href={`/projects/${projectId}/nodes/new`}>
      New node
    </ButtonLink>
  ) : null;
  const rows = nodes.data.nodes;
  const currency = rows.find((row) => row.leading)?.leading?.currency ?? "";
  return (
    <PageBody>
      <PageHead
        above={`${project.data.organisation.name} · register of nodes`}
        title={project.data.name}
        tools={newNode ? <ToolStrip label="Register">{newNode}</ToolStrip> : null}
      >
        <p>{rows.length === 0 ? project.data.description : `${summary(rows)}.`}</p>
      </PageHead>
      {rows.length === 0 ? (
        <Empty title="No nodes yet" actions={newNode}>
          <p>
            {editNodes
              ? "Enter the first: a column, its beams, the connection and the load cases."
              : "The designers of this project have not entered a node."}
          </p>
        </Empty>
      ) : (
        <Ready
          project={project.data}
          rows={rows}
          moneyUnit={nodes.data.money === "index" ? "index" : currency}
        />
      )}
    </PageBody>
  );
}
