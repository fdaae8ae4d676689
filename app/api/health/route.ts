import { jsonReply } from "@/lib/http/reply";
import { checkHealth } from "@/lib/services/health";
import packageFacts from "@/package.json";

/** Open to everybody: a monitor has no session. */
export async function GET(): Promise<Response> {
  const health = await checkHealth(packageFacts.version);
  return jsonReply(health, health.ok ? 200 : 503);
}
