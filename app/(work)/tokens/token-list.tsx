"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { revokeTokenMutation } from "@/lib/client/mutations";
import { tokensOptions } from "@/lib/client/queries";
import type { AccessToken } from "@/lib/schemas/access-token";
import { PageBody, PageHead } from "@/components/layout/page-head";
import { Button, ToolStrip } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { shortDate } from "@/components/ui/short-date";
import { Empty, Failed, Loading } from "@/components/ui/states";
import { Table, Td, Th } from "@/components/ui/table";
import { NewTokenDialog } from "./new-token-dialog";

function TokenTable({
  tokens,
  onRevoke,
}: {
  readonly tokens: readonly AccessToken[];
  readonly onRevoke: (token: AccessToken) => void;
}) {
  return (
    <Table label="Access tokens">
      <thead>
        <tr>
          <Th>What it is for</Th>
          <Th>Begins with</Th>
          <Th>Made</Th>
          <Th>Last used</Th>
          <Th>Ends</Th>
          <Th>
            <span className="sr-only">Revoke</span>
          </Th>
        </tr>
      </thead>
      <tbody>
        {tokens.map((token) => (
          <tr key={token.id}>
            <th scope="row" className="border-t border-rule px-3 py-2 text-left align-top font-semibold">
              {token.name}
            </th>
            <Td>
              <code>{token.hint}…</code>
            </Td>
            <Td className="whitespace-nowrap">{shortDate(token.createdAt)}</Td>
            <Td className="whitespace-nowrap">{token.lastUsedAt ? shortDate(token.lastUsedAt) : "never"}</Td>
            <Td className="whitespace-nowrap">{shortDate(token.expiresAt)}</Td>
            <Td className="text-right">
              <Button kind="quiet" aria-label={`Revoke ${token.name}`} onClick={() => onRevoke(token)}>
                Revoke
              </Button>
            </Td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function RevokeDialog({ token, onClose }: { readonly token: AccessToken; readonly onClose: () => void }) {
  const revoke = useMutation(revokeTokenMutation(useQueryClient()));
  return (
    <Dialog
      title={`Revoke ${token.name}?`}
      onClose={onClose}
      actions={
        <>
          <Button onClick={onClose}>Keep it</Button>
          <Button
            kind="danger"
            isBusy={revoke.isPending}
            busyLabel="Revoking it"
            onClick={() => revoke.mutate({ tokenId: token.id }, { onSuccess: onClose })}
          >
            Revoke the token
          </Button>
        </>
      }
    >
      <p>Programs that use it are refused from then on. It cannot be brought back.</p>
      {revoke.error ? (
        <p role="alert" className="mt-3 font-semibold text-fail">
          {revoke.error.message}
        </p>
      ) : null}
    </Dialog>
  );
}

/** One's own tokens in four states, a way to make one and a way to end one. */
export function TokenList() {
  const tokens = useQuery(tokensOptions());
  const [isCreating, setIsCreating] = useState(false);
  const [revoking, setRevoking] = useState<AccessToken | null>(null);
  const newToken = (
    <Button kind="primary" onClick={() => setIsCreating(true)}>
      New token
    </Button>
  );
  return (
    <PageBody>
      <PageHead title="Access tokens" tools={<ToolStrip label="Access tokens">{newToken}</ToolStrip>}>
        <p>
          A token lets a program of yours send node documents to <code>/api/evaluate</code> as you. It opens
          nothing else.
        </p>
      </PageHead>
      {tokens.isPending ? (
        <Loading what="your tokens" />
      ) : tokens.isError ? (
        <Failed
          title="Your tokens could not be read."
          error={tokens.error}
          onRetry={() => void tokens.refetch()}
        />
      ) : tokens.data.length === 0 ? (
        <Empty title="No tokens" actions={newToken}>
          <p>Make one for each program, so that each can be revoked by itself.</p>
        </Empty>
      ) : (
        <TokenTable tokens={tokens.data} onRevoke={setRevoking} />
      )}
      {isCreating ? <NewTokenDialog onClose={() => setIsCreating(false)} /> : null}
      {revoking ? <RevokeDialog token={revoking} onClose={() => setRevoking(null)} /> : null}
    </PageBody>
  );
}
