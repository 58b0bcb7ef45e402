import { Figure } from '@/components/figure/Figure';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import { LinkButton } from '@/components/ui/LinkButton';

/** What this is, in one breath, beside the figure. */
export function Opening() {
  return (
    <section className="grid items-center gap-8 md:grid-cols-[1fr_20rem]">
      <div className="grid justify-items-start gap-5">
        <h1 className="text-2xl md:max-w-[18ch]">
          Read what the cloth says. Change a little. See whether it worked.
        </h1>
        <p className="max-w-prose">
          Ruckle is a fitting journal. You sew a muslin and wear it; you photograph each round and mark the
          drag lines; Ruckle ranks what they may mean, says how sure it is, and gives one small change at a
          time with the test that would settle it. Then you sew again and lay both rounds side by side.
        </p>
        <LinkButton href="/sign-up" look="chalk">
          Begin a journal
        </LinkButton>
      </div>
      <div className="mx-auto w-full max-w-72">
        <Figure view="back" proportions={REFERENCE_PROPORTIONS} title="The back of a figure in trousers" />
      </div>
    </section>
  );
}
