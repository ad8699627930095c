// Framing of PostgreSQL's wire protocol, version 3: PostgreSQL documentation, "Frontend/Backend Protocol", "Message Formats".

export type MessageKind = 'startup' | 'encryption' | 'cancel' | 'typed';

export interface Message {
  readonly kind: MessageKind;
  /** The type letter; empty for the three that carry none. */
  readonly type: string;
  readonly bytes: Buffer;
}

const PROTOCOL_3 = 196_608;
const CANCEL = 80_877_102;
const SSL = 80_877_103;
const GSS = 80_877_104;

/** Longest message taken from a client. A draft of 5 MB fits several times over. */
export const LONGEST_MESSAGE = 64 * 1024 * 1024;

/** Cuts a client's byte stream into messages. */
export class Frames {
  #rest: Buffer = Buffer.alloc(0);
  #started = false;

  push(bytes: Buffer): void {
    this.#rest = this.#rest.length === 0 ? bytes : Buffer.concat([this.#rest, bytes]);
  }

  /** The next whole message, or null until more bytes arrive. Throws RangeError on what is not this protocol. */
  next(): Message | null {
    const head = this.#started ? 1 : 0;
    if (this.#rest.length < head + 4) return null;
    const length = head + this.#rest.readInt32BE(head);
    if (length < head + 4 || length > LONGEST_MESSAGE) throw new RangeError(`message of ${length} bytes`);
    if (this.#rest.length < length) return null;
    const bytes = this.#rest.subarray(0, length);
    this.#rest = this.#rest.subarray(length);
    return this.#started ? { kind: 'typed', type: String.fromCharCode(bytes.readUInt8(0)), bytes } : this.#first(bytes);
  }

  #first(bytes: Buffer): Message {
    if (bytes.length < 8) throw new RangeError(`opening message of ${bytes.length} bytes`);
    const code = bytes.readInt32BE(4);
    if (code === SSL || code === GSS) return { kind: 'encryption', type: '', bytes };
    if (code === CANCEL) return { kind: 'cancel', type: '', bytes };
    if (code !== PROTOCOL_3) throw new RangeError(`unknown protocol ${code}`);
    this.#started = true;
    return { kind: 'startup', type: '', bytes };
  }
}

/** SQL text inside a Query or Parse message; null for every other message. */
export function sqlOf({ type, bytes }: Message): string | null {
  if (type === 'Q') return bytes.toString('utf8', 5, bytes.length - 1);
  if (type !== 'P') return null;
  const nameEnd = bytes.indexOf(0, 5);
  const textEnd = bytes.indexOf(0, nameEnd + 1);
  return nameEnd < 0 || textEnd < 0 ? null : bytes.toString('utf8', nameEnd + 1, textEnd);
}

/** Whether this Bind fills a statement that was named and parsed in some earlier query. */
export function bindsNamed({ type, bytes }: Message): boolean {
  if (type !== 'B') return false;
  const portalEnd = bytes.indexOf(0, 5);
  return portalEnd >= 0 && bytes[portalEnd + 1] !== 0;
}

const typed = (type: string, body: Buffer): Buffer => {
  const bytes = Buffer.alloc(5 + body.length);
  bytes.write(type, 0, 'latin1');
  bytes.writeInt32BE(4 + body.length, 1);
  body.copy(bytes, 5);
  return bytes;
};

/** A simple query. */
export const queryMessage = (sql: string): Buffer => typed('Q', Buffer.from(`${sql}\0`));

/** What ends an extended query and makes the backend say where it stands. */
export const syncMessage = (): Buffer => typed('S', Buffer.alloc(0));

/** An error that ends the client's connection. */
export const fatalMessage = (code: string, text: string): Buffer =>
  typed('E', Buffer.from(`SFATAL\0VFATAL\0C${code}\0M${text}\0\0`));

export type Standing = 'idle' | 'inTransaction' | 'failed';

const READY_LENGTH = 6;
const STANDING: Readonly<Record<string, Standing>> = { I: 'idle', T: 'inTransaction', E: 'failed' };

/** Where the backend stands, read from the ReadyForQuery that closes its answer; null when the answer is not closed. */
export function standingOf(answer: Uint8Array): Standing | null {
  const at = answer.length - READY_LENGTH;
  if (at < 0 || answer[at] !== 0x5a || answer[at + 4] !== 5) return null;
  return STANDING[String.fromCharCode(answer[at + 5] ?? 0)] ?? null;
}

/** The answer without its ReadyForQuery. */
export const withoutReady = (answer: Uint8Array): Uint8Array =>
  standingOf(answer) === null ? answer : answer.subarray(0, answer.length - READY_LENGTH);
