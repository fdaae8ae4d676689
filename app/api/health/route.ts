import { jsonReply } from "@/lib/http/reply";
import { checkHealth } from "@/lib/services/health";

/** Open to everybody: a monitor has no session. */
export async function GET(): Promise<Response> {
  const health = await checkHealth();
  return jsonReply(health, health.ok ? 200 : 503);
}
