import Link from "next/link";
import type { ReactNode } from "react";

export interface SheetCrumbsProps {
  readonly projectId: string;
  readonly projectName: string;
  /** Facts of the node after the way to it. */
  readonly children: ReactNode;
}

const CRUMB = "hover:text-ink hover:underline";

/** The way back to the register, then the facts of this node. Roles on spans: the page's head sets it into a paragraph. */
export function SheetCrumbs({ projectId, projectName, children }: SheetCrumbsProps) {
  return (
    <span className="flex flex-wrap items-baseline gap-x-4">
      <span role="navigation" aria-label="Breadcrumb">
        <Link href="/projects" className={CRUMB}>
          Projects
        </Link>
        {" / "}
        <Link href={`/projects/${projectId}`} className={CRUMB}>
          {projectName}
        </Link>
        {" / "}
        <span aria-current="page">Node sheet</span>
      </span>
      <span>{children}</span>
    </span>
  );
}
