/** A stretch of a mail's text: words, or a link on a line of its own. */
export interface MailPiece {
  readonly text: string;
  readonly link: boolean;
}

/** Cuts a mail's text at its web addresses. Nothing else becomes a link. */
export const mailPieces = (text: string): readonly MailPiece[] =>
  text
    .split(/(https?:\/\/[^\s<>"']+)/)
    .map((piece, index) => ({ text: piece, link: index % 2 === 1 }))
    .filter((piece) => piece.text !== '');
