import type { ReactNode, TdHTMLAttributes, ThHTMLAttributes } from 'react';

interface TableProps {
  /** Read out, and shown only when `showCaption` is set. */
  readonly caption: string;
  readonly showCaption?: boolean;
  readonly head: readonly { readonly text: string; readonly numeric?: boolean; readonly hidden?: boolean }[];
  readonly children: ReactNode;
}

/** Hairlines, no box. It scrolls sideways in its own strip when it must, never the page. */
export function Table({ caption, showCaption, head, children }: TableProps) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a strip that scrolls must be reached by the keyboard
    <section aria-label={caption} className="relative overflow-x-auto" tabIndex={0}>
      <table className="w-full border-collapse text-left text-sm">
        <caption className={showCaption ? 'heading pb-2 text-left text-base' : 'sr-only'}>{caption}</caption>
        <thead>
          <tr className="border-b border-ink-soft">
            {head.map(({ text, numeric, hidden }) => (
              <th
                key={text}
                scope="col"
                className={`py-2 pr-4 font-[560] text-ink-soft ${numeric ? 'text-right' : ''}`}
              >
                {hidden ? <span className="sr-only">{text}</span> : text}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>{children}</tbody>
      </table>
    </section>
  );
}

export function Row({ children, marked = false }: { readonly children: ReactNode; readonly marked?: boolean }) {
  return (
    <tr className={`border-b border-rule align-top ${marked ? 'shadow-[inset_3px_0_0_var(--tape)]' : ''}`}>
      {children}
    </tr>
  );
}

export const RowHead = ({ className = '', ...rest }: ThHTMLAttributes<HTMLTableCellElement>) => (
  <th scope="row" className={`py-2.5 pr-4 font-[560] ${className}`} {...rest} />
);

interface CellProps extends TdHTMLAttributes<HTMLTableCellElement> {
  readonly numeric?: boolean;
}
export const Cell = ({ numeric, className = '', ...rest }: CellProps) => (
  <td className={`py-2.5 pr-4 ${numeric ? 'text-right whitespace-nowrap' : ''} ${className}`} {...rest} />
);
