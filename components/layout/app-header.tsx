"use client";
import { useQuery } from "@tanstack/react-query";
import { signOut } from "next-auth/react";
import { useParams, usePathname } from "next/navigation";
import { projectOptions } from "@/lib/client/queries";
import { HeaderLink, SiteHeader } from "./site-header";
import type { Theme } from "./theme";
import { ThemeSwitch } from "./theme-switch";

export interface AppHeaderProps {
  readonly person: { readonly name: string; readonly role: string };
  readonly theme: Theme;
}

function CurrentProject({ projectId }: { readonly projectId: string }) {
  const project = useQuery(projectOptions(projectId));
  if (!project.data) return null;
  return (
    <HeaderLink href={`/projects/${projectId}`} isHere>
      {project.data.name}
    </HeaderLink>
  );
}

/** The head of every signed-in page: where you are, who you are, the way out. */
export function AppHeader({ person, theme }: AppHeaderProps) {
  const pathname = usePathname();
  const { projectId } = useParams<{ projectId?: string }>();
  return (
    <SiteHeader
      end={
        <>
          <span className="text-soft">{`${person.name}, ${person.role}`}</span>
          <HeaderLink href="/tokens" isHere={pathname === "/tokens"}>
            Access tokens
          </HeaderLink>
          <ThemeSwitch initial={theme} />
          <button
            type="button"
            className="text-soft underline-offset-2 hover:text-ink hover:underline"
            onClick={() => void signOut({ callbackUrl: "/sign-in" })}
          >
            Sign out
          </button>
        </>
      }
    >
      <HeaderLink href="/projects" isHere={pathname === "/projects"}>
        Projects
      </HeaderLink>
      {projectId ? <CurrentProject projectId={projectId} /> : null}
      <HeaderLink href="/catalog" isHere={pathname === "/catalog"}>
        Catalogue
      </HeaderLink>
      <HeaderLink href="/method" isHere={pathname === "/method"}>
        Method
      </HeaderLink>
    </SiteHeader>
  );
}
