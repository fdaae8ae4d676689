import type { Metadata } from "next";
import { PageBody, PageHead } from "@/components/layout/page-head";

export const metadata: Metadata = { title: "Accessibility" };

/** What everyone can rely on, and what is known not to be good enough. */
export default function AccessibilityPage() {
  return (
    <PageBody>
      <PageHead title="Accessibility">
        <p>
          Everyone who designs, prices, makes or checks steel should be able to work here. The aim is WCAG
          2.2, level AA.
        </p>
      </PageHead>
      <div className="grid max-w-[80ch] gap-6">
        <section aria-labelledby="by-keyboard">
          <h2 id="by-keyboard">By keyboard</h2>
          <p className="mt-1">
            Everything works without a mouse. The first Tab on a page offers a way past the head. The
            comparison is one Tab stop: arrow keys move between its cells, Home and End go to the ends of a
            row, Ctrl with them to the ends of the table, and Enter opens the working of the number you are
            on. Escape closes what is open, and you are back where you were.
          </p>
        </section>
        <section aria-labelledby="without-colour">
          <h2 id="without-colour">Without colour, in the dark, enlarged</h2>
          <p className="mt-1">
            Pass, tight and fail are told by a word and a mark; colour comes last. Added parts are told apart
            on the drawings by hatch. There is a light and a dark sheet, both tested for contrast, and your
            system’s own colours are respected, as is its wish for less motion. A comparison of many options
            is wider than a small window: it moves sideways while its row heads stay.
          </p>
        </section>
        <section aria-labelledby="by-ear">
          <h2 id="by-ear">With a screen reader</h2>
          <p className="mt-1">
            Pages have headings and landmarks, tables have row and column heads, drawings have a description
            in words, charts stand beside a table with the same figures, and formulas are MathML.
          </p>
        </section>
        <section aria-labelledby="known-gaps">
          <h2 id="known-gaps">Known gaps</h2>
          <p className="mt-1">
            Old browsers without MathML show formulas without fraction bars. The work has been tested by tools
            and by keyboard, not yet by people who use a screen reader every day.
          </p>
        </section>
      </div>
    </PageBody>
  );
}
