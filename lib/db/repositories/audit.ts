import type { Transaction } from "sequelize";
import { AuditEntry } from "@/models/audit-entry";

/** Every kind of line in the audit trail. */
export const AUDIT_ACTIONS = [
  "person.signed-in",
  "person.signed-out",
  "access-token.issued",
  "access-token.revoked",
  "project.created",
  "project.edited",
  "project.member-added",
  "project.member-removed",
  "node.created",
  "node.saved",
  "node.deleted",
  "node.exclusions-set",
  "comparison.calculated",
  "stock-plates.set",
] as const;

export interface AuditLine {
  readonly actorId: string;
  readonly organisationId: string;
  readonly projectId?: string;
  readonly action: (typeof AUDIT_ACTIONS)[number];
  readonly subjectId: string;
  readonly detail?: Record<string, unknown>;
}

/** Adds the line in the transaction of the change it tells of. */
export async function writeAudit(tx: Transaction, { projectId, detail, ...line }: AuditLine): Promise<void> {
  await AuditEntry.create(
    { ...line, projectId: projectId ?? null, detail: detail ?? {} },
    { transaction: tx },
  );
}
