import { outbox as words } from '@/lib/text/en/pages';
import { Time } from '../ui/Time';
import { mailPieces } from './mailLinks';

interface Mail {
  readonly id: string;
  readonly recipient: string;
  readonly subject: string;
  readonly text: string;
  readonly createdAt: string;
}

/** Mails as they were written, their links to follow. */
export function MailList({ mails }: { readonly mails: readonly Mail[] }) {
  if (mails.length === 0) return <p className="text-ink-soft">{words.empty}</p>;
  return (
    <ul className="border-t border-ink-soft">
      {mails.map(({ id, recipient, subject, text, createdAt }) => (
        <li key={id} className="grid gap-2 border-b border-rule py-4">
          <h2 className="text-base">{subject}</h2>
          <p className="text-sm text-ink-soft">
            {words.to} <span className="break-all text-ink">{recipient}</span> · <Time iso={createdAt} />
          </p>
          <p className="text-sm whitespace-pre-line">
            {mailPieces(text.trim()).map((piece) =>
              piece.link ? (
                <a key={piece.text} href={piece.text} className="break-all text-petrol">
                  {piece.text}
                </a>
              ) : (
                piece.text
              ),
            )}
          </p>
        </li>
      ))}
    </ul>
  );
}
