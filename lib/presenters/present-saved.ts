import type { RevisionRecord } from "@/lib/db/repositories/nodes";
import type { SavedDocument } from "@/lib/schemas/node";

/** A document with the one who saved it and when; nothing is left out. */
export const presentSaved = ({ document, version, savedBy, savedAt }: RevisionRecord): SavedDocument => ({
  document,
  version,
  savedBy,
  savedAt: savedAt.toISOString(),
});
