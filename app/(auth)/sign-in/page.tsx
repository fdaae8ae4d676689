import type { Metadata } from "next";
import { PageBody } from "@/components/layout/page-head";
import { safeCallbackPath } from "@/lib/auth/callback-path";
import { SignInForm } from "./sign-in-form";

export const metadata: Metadata = { title: "Sign in" };

type Search = Promise<{ readonly callbackUrl?: string | string[] }>;

/** Getting in. Where to go afterwards is checked here, on the server: only paths of this site pass. */
export default async function SignInPage({ searchParams }: { readonly searchParams: Search }) {
  const { callbackUrl } = await searchParams;
  return (
    <PageBody>
      <div className="grid gap-x-20 gap-y-10 pt-10 desk:grid-cols-[24rem_minmax(0,36rem)]">
        <section aria-labelledby="sign-in-title">
          <h1 id="sign-in-title">Sign in</h1>
          <SignInForm callbackPath={safeCallbackPath(typeof callbackUrl === "string" ? callbackUrl : null)} />
        </section>
        <section
          className="border-t-2 border-ink pt-4 desk:border-t-0 desk:border-l-2 desk:pt-0 desk:pl-8"
          aria-label="What this is"
        >
          <p className="text-lead">
            <b className="font-[650]">How is this column panel to be stiffened?</b> Give the node and its load
            cases. Panelwright works out every sensible way, checks each against EN 1993-1-8, prices and times
            it at the shop’s own rates, and ranks them side by side. Each number opens into its working.
          </p>
          <p className="mt-4 text-note text-soft">
            It supports a competent engineer’s judgement and does not replace it. Accounts are made by your
            organisation’s admin. On a new installation the first passwords are printed once, where the
            program was started.
          </p>
        </section>
      </div>
    </PageBody>
  );
}
