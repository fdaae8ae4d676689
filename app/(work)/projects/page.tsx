import type { Metadata } from "next";
import { requireActor } from "@/lib/auth/require-actor";
import { ProjectList } from "./project-list";

export const metadata: Metadata = { title: "Projects" };

/** The projects this person is a member of. */
export default async function ProjectsPage() {
  await requireActor();
  return <ProjectList />;
}
