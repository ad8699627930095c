'use client';

import { Thumbnail } from '@/components/thumbnail/Thumbnail';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { Bar } from '@/components/ui/Page';
import type { LayoutChoice } from '@/components/workshop/NewDesign';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { tryOut as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';

interface TryStartProps {
  readonly layouts: readonly LayoutChoice[];
  readonly kept: Airframe | string | null;
  readonly onStart: (layout: LayoutChoice) => void;
  readonly onGoOn: (airframe: Airframe) => void;
}

/** Pick a starting layout by its picture, or go on with what this browser kept. */
export function TryStart({ layouts, kept, onStart, onGoOn }: TryStartProps) {
  return (
    <>
      <Bar who={null} />
      <main id="content" className="mx-auto grid max-w-[1240px] gap-6 px-4 py-6 sm:px-6">
        <h1 className="text-xl md:text-2xl">{texts.title}</h1>
        <p className="text-ink-soft">{texts.lead}</p>
        {kept !== null && typeof kept !== 'string' ? (
          <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
            <Button weight="primary" onClick={() => onGoOn(kept)}>
              {fill(texts.goOn, { name: kept.name })}
            </Button>
            <span className="text-sm text-ink-soft">{texts.goOnHint}</span>
          </div>
        ) : null}
        {typeof kept === 'string' ? <Notice tone="watch" title={fill(texts.unreadable, { message: kept })} /> : null}
        <h2 className="text-lg">{texts.choose}</h2>
        <ul className="grid gap-4 sm:grid-cols-2 lg:grid-cols-4">
          {layouts.map((layout) => (
            <li key={layout.id}>
              <button
                type="button"
                data-testid={`try-${layout.id}`}
                onClick={() => onStart(layout)}
                className="grid h-full w-full content-start gap-2 rounded-cut border border-rule bg-paper p-2 text-left hover:border-ink-soft"
              >
                <Thumbnail outlines={layout.outlines} label="" />
                <span className="font-[560]">{layout.name}</span>
                <span className="dense text-sm text-ink-soft">{layout.what}</span>
              </button>
            </li>
          ))}
        </ul>
      </main>
    </>
  );
}
