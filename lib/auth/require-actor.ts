import { cookies, headers } from "next/headers";
import { redirect } from "next/navigation";
import { environment } from "@/lib/config/env";
import { actorOfCookie, type SignedIn } from "./current-actor";
import { PATH_HEADER } from "./path-header";
import { sessionCookieName } from "./session-cookie";

/** For server pages: who is signed in. Nobody is sent to sign in and back to this page afterwards. */
export async function requireActor(): Promise<SignedIn> {
  const jar = await cookies();
  const actor = await actorOfCookie(jar.get(sessionCookieName(environment().baseUrl))?.value);
  if (actor !== null) return actor;
  const path = (await headers()).get(PATH_HEADER) ?? "/";
  redirect(`/sign-in?callbackUrl=${encodeURIComponent(path)}`);
}
