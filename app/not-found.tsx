import { SiteHeader } from "@/components/layout/site-header";
import { PageBody, PageHead } from "@/components/layout/page-head";
import { ButtonLink } from "@/components/ui/button";

/** A place that does not exist, or that this person may not see; the two are not told apart. */
export default function NotFound() {
  return (
    <>
      <SiteHeader />
      <main id="main">
        <PageBody>
          <PageHead title="There is nothing here">
            <p>
              The address is wrong, the thing was deleted, or it belongs to a project you are not a member of.
            </p>
          </PageHead>
          <ButtonLink href="/projects">Projects</ButtonLink>
        </PageBody>
      </main>
    </>
  );
}
