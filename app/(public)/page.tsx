import { redirect } from "next/navigation";

/** The home of the site is the work itself; whoever is not signed in is sent to sign in from there. */
export default function HomePage() {
  redirect("/projects");
}
