"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useRef, useState, type FormEvent } from "react";
import type { StockPlateRow } from "@/lib/catalog/catalog";
import { setStockPlatesMutation } from "@/lib/client/mutations";
import { meOptions } from "@/lib/client/queries";
import { SetStockPlates } from "@/lib/schemas/catalog";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/field";
import { Table, Td, Th } from "@/components/ui/table";

/** A typed thickness, with a decimal point or comma; null for anything else. */
function readThickness(typed: string): number | null {
  const text = typed.trim().replace(",", ".");
  return /^\d+(\.\d+)?$/.test(text) ? Number(text) : null;
}

/** Why a list cannot be kept, in the words of the schema that the server reads it with; null if it can. */
function faultOf(thicknesses: readonly number[]): string | null {
  const parsed = SetStockPlates.safeParse({ thicknesses });
  return parsed.success ? null : (parsed.error.issues[0]?.message ?? "This list cannot be kept.");
}

interface PlateListProps {
  readonly plates: readonly StockPlateRow[];
  readonly onRemove: ((thicknessMm: number) => void) | null;
}

function PlateList({ plates, onRemove }: PlateListProps) {
  return (
    <Table label="Stock plates">
      <thead>
        <tr>
          <Th className="text-right">Thickness, mm</Th>
          <Th>Source</Th>
          {onRemove ? <Th>Change</Th> : null}
        </tr>
      </thead>
      <tbody>
        {plates.map(({ thicknessMm, source }) => (
          <tr key={thicknessMm} className="hover:bg-petrolwash">
            <th scope="row" className="border-t border-rule px-3 py-2 text-right align-middle font-semibold">
              {thicknessMm}
            </th>
            <Td className="align-middle text-note text-soft">{source}</Td>
            {onRemove ? (
              <Td className="py-0.5">
                <Button
                  kind="quiet"
                  aria-label={`Take ${thicknessMm} mm off the list`}
                  onClick={() => onRemove(thicknessMm)}
                >
                  Take off
                </Button>
              </Td>
            ) : null}
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

/** The plate thicknesses that proposals are sized from; who may, adds and takes off. */
export function StockPlates({ plates }: { readonly plates: readonly StockPlateRow[] }) {
  const canEdit = useQuery(meOptions()).data?.abilities.editStockPlates ?? false;
  const save = useMutation(setStockPlatesMutation(useQueryClient()));
  const [typed, setTyped] = useState("");
  const [fault, setFault] = useState<string | null>(null);
  const [said, setSaid] = useState("");
  const field = useRef<HTMLInputElement>(null);
  const known = plates.map((plate) => plate.thicknessMm);

  const keep = (thicknesses: readonly number[], words: string, onKept: () => void) => {
    if (save.isPending) return;
    const refusal = faultOf(thicknesses);
    setFault(refusal);
    setSaid("");
    if (refusal !== null) return;
    save.mutate(
      { thicknesses: [...thicknesses] },
      {
        onSuccess: () => {
          setSaid(words);
          onKept();
        },
        onError: (error) => setFault(error.message),
      },
    );
  };
  const add = (event: FormEvent) => {
    event.preventDefault();
    const thickness = readThickness(typed);
    if (thickness === null) return setFault("Give a thickness in mm.");
    keep([...known, thickness], `${thickness} mm is on the list.`, () => setTyped(""));
  };
  const remove = (thickness: number) =>
    keep(
      known.filter((other) => other !== thickness),
      `${thickness} mm is off the list.`,
      () => field.current?.focus(),
    );
  return (
    <div className="grid max-w-3xl gap-4">
      <p className="text-soft">
        Options are sized from these thicknesses. A change counts from the next calculation; comparisons
        already made stay as they are.
      </p>
      {canEdit ? (
        <form onSubmit={add} noValidate className="flex flex-wrap items-start gap-3">
          <TextField
            ref={field}
            label="Add a thickness, mm"
            inputMode="decimal"
            value={typed}
            onChange={(event) => setTyped(event.target.value)}
            error={fault ?? undefined}
            fieldClassName="w-56"
          />
          <Button
            type="submit"
            kind="primary"
            className="mt-[1.4rem]"
            isBusy={save.isPending}
            busyLabel="Saving"
          >
            Add
          </Button>
        </form>
      ) : null}
      <p role="status" className="text-note text-soft">
        {said}
      </p>
      <PlateList plates={plates} onRemove={canEdit ? remove : null} />
    </div>
  );
}
