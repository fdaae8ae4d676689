"use client";
import { Button, ButtonLink } from "@/components/ui/button";
import { PageBody, PageHead } from "@/components/layout/page-head";

/** What a page shows when drawing it failed. The reason stays on the server; the digest finds it there. */
export default function PageError({
  error,
  reset,
}: {
  readonly error: Error & { digest?: string };
  readonly reset: () => void;
}) {
  return (
    <main id="main">
      <PageBody>
        <PageHead
          title="This page could not be drawn"
          above={error.digest ? `Reference ${error.digest}` : undefined}
        >
          <p>
            Nothing was changed. Try again; if it fails once more, give the reference to whoever runs this
            installation.
          </p>
        </PageHead>
        <div className="flex gap-2">
          <Button kind="primary" onClick={reset}>
            Try again
          </Button>
          <ButtonLink href="/projects">Projects</ButtonLink>
        </div>
      </PageBody>
    </main>
  );
}
