import { print as words } from '@/lib/text/en/pages';
import { WatchIcon } from '../ui/icons';
import { Section } from '../ui/Page';

/** What comes out, how to print it true to scale, and what to mind with a blade in the hand. */
export function PrintAdvice() {
  return (
    <>
      <Section title={words.what}>
        <List lines={words.whatList} />
      </Section>
      <Section title={words.how}>
        <ol className="grid list-decimal gap-1 pl-5 marker:text-ink-soft">
          {words.howList.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ol>
      </Section>
      <Section
        title={words.cut}
        aside={
          <span className="text-watch">
            <WatchIcon />
          </span>
        }
      >
        <List lines={words.cutList} />
        <p className="text-sm text-ink-soft">{words.estimate}</p>
      </Section>
    </>
  );
}

function List({ lines }: { readonly lines: readonly string[] }) {
  return (
    <ul className="grid list-['–_'] gap-1 pl-4 marker:text-ink-soft">
      {lines.map((line) => (
        <li key={line}>{line}</li>
      ))}
    </ul>
  );
}
