import type { ReactNode } from "react";

export interface PageHeadProps {
  /** One small line above the title: where this is, in facts. */
  readonly above?: ReactNode;
  readonly title: ReactNode;
  /** The sentence the page has to say. */
  readonly children?: ReactNode;
  readonly tools?: ReactNode;
}

/** The head of a page: facts, title, sentence; tools at the right. */
export function PageHead({ above, title, children, tools }: PageHeadProps) {
  return (
    <div className="grid items-end gap-x-6 gap-y-4 pt-[22px] pb-[18px] desk:grid-cols-[minmax(0,1fr)_auto]">
      <div>
        {above ? <p className="mb-[7px] text-label text-soft">{above}</p> : null}
        <h1>{title}</h1>
        {children ? <div className="mt-2.5 max-w-[860px] text-lead">{children}</div> : null}
      </div>
      {tools}
    </div>
  );
}

/** The width and margins all pages share. */
export function PageBody({ children }: { readonly children: ReactNode }) {
  return <div className="px-5 pb-10 desk:px-9">{children}</div>;
}
