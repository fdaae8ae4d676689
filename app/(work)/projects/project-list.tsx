"use client";
import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { useState } from "react";
import { meOptions, projectsOptions } from "@/lib/client/queries";
import type { Project } from "@/lib/schemas/project";
import { PageBody, PageHead } from "@/components/layout/page-head";
import { Button, ToolStrip } from "@/components/ui/button";
import { Chip } from "@/components/ui/chip";
import { shortDate } from "@/components/ui/short-date";
import { Empty, Failed, Loading } from "@/components/ui/states";
import { Table, Td, Th } from "@/components/ui/table";
import { NewProjectDialog } from "./new-project-dialog";

function ProjectTable({ projects }: { readonly projects: readonly Project[] }) {
  return (
    <Table label="Projects">
      <thead>
        <tr>
          <Th>Project</Th>
          <Th className="text-right">Nodes</Th>
          <Th>Organisation</Th>
          <Th>Last change</Th>
        </tr>
      </thead>
      <tbody>
        {projects.map((project) => (
          <tr key={project.id} className="hover:bg-petrolwash">
            <th scope="row" className="border-t border-rule px-3 py-2 text-left font-normal">
              <Link
                href={`/projects/${project.id}`}
                className="text-[0.9375rem] font-[650] text-ink underline decoration-rule2 underline-offset-4 hover:decoration-petrol"
              >
                {project.name}
              </Link>
              {project.isLocked ? (
                <span className="ml-2">
                  <Chip>locked</Chip>
                </span>
              ) : null}
              {project.description ? (
                <span className="mt-0.5 block max-w-[70ch] text-note text-soft">{project.description}</span>
              ) : null}
            </th>
            <Td className="py-2 text-right">{project.nodeCount}</Td>
            <Td className="py-2">{project.organisation.name}</Td>
            <Td className="py-2 whitespace-nowrap">{shortDate(project.updatedAt)}</Td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

/** The list of projects in its four states. */
export function ProjectList() {
  const projects = useQuery(projectsOptions());
  const canCreate = useQuery(meOptions()).data?.abilities.createProject ?? false;
  const [isCreating, setIsCreating] = useState(false);
  const newProject = canCreate ? (
    <Button kind="primary" onClick={() => setIsCreating(true)}>
      New project
    </Button>
  ) : null;
  return (
    <PageBody>
      <PageHead
        title="Projects"
        tools={newProject ? <ToolStrip label="Projects">{newProject}</ToolStrip> : null}
      >
        <p>Open a project to see its register of nodes.</p>
      </PageHead>
      {projects.isPending ? (
        <Loading what="the projects" />
      ) : projects.isError ? (
        <Failed
          title="The projects could not be read."
          error={projects.error}
          onRetry={() => void projects.refetch()}
        />
      ) : projects.data.length === 0 ? (
        <Empty title="No projects yet" actions={newProject}>
          <p>
            {canCreate
              ? "Make one, and enter its first node."
              : "You see a project here as soon as its people add you to it."}
          </p>
        </Empty>
      ) : (
        <ProjectTable projects={projects.data} />
      )}
      {isCreating ? <NewProjectDialog onClose={() => setIsCreating(false)} /> : null}
    </PageBody>
  );
}
