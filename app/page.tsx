import { ShowPiece } from '@/components/figures/ShowPiece';
import { LinkButton } from '@/components/ui/Button';
import { Bar } from '@/components/ui/Page';
import { ScoreLine } from '@/components/ui/ScoreLine';
import { front as words } from '@/lib/text/en/pages';
import { currentWho } from '@/server/session';
import { showcase } from './loaders';

export default async function FrontPage() {
  const who = await currentWho();
  return (
    <>
      <Bar who={who?.name ?? null} />
      <main
        id="content"
        className="mx-auto grid max-w-[1240px] gap-10 px-4 py-8 sm:px-6 lg:grid-cols-[400px_minmax(0,1fr)] lg:gap-16 lg:py-10"
      >
        <div className="grid content-start gap-6">
          <h1 className="text-2xl md:text-3xl">{words.title}</h1>
          <p>{words.lead}</p>
          <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
            <LinkButton href="/try" weight="primary">
              {words.tryBoard}
            </LinkButton>
            <span className="text-sm text-ink-soft">{words.tryHint}</span>
          </div>
          <ScoreLine />
          <ol className="grid gap-3">
            {words.steps.map((step, index) => (
              <li key={step} className="grid grid-cols-[24px_1fr] text-sm">
                <span className="figure text-ink-soft">{index + 1}</span>
                {step}
              </li>
            ))}
          </ol>
          <p className="text-sm text-ink-soft">{words.caution}</p>
        </div>
        <ShowPiece {...showcase()} />
      </main>
    </>
  );
}
