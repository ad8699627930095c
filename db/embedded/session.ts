import type { Socket } from 'node:net';
import {
  Frames,
  fatalMessage,
  type Message,
  queryMessage,
  sqlOf,
  standingOf,
  syncMessage,
  withoutReady,
} from './messages';
import type { Turns } from './turns';
import { mayWrite } from './writes';

/** The one backend behind all clients. */
export interface Backend {
  execProtocolRaw(message: Uint8Array): Promise<Uint8Array>;
}

export interface Shared {
  readonly backend: Backend;
  readonly turns: Turns;
  /** Puts what was committed on the disk; awaited before the client hears of its commit. */
  readonly synchronise: () => Promise<void>;
  /** False when the disk has too little room for a write. */
  readonly hasRoom: () => Promise<boolean>;
  /** A transaction that says nothing for this long is rolled back, because everybody else waits for it. */
  readonly idleLimitMs: number;
}

// SQLSTATE 53100 is disk_full. PGlite itself never returns from a write to a full disk, so the write must not begin.
const DISK_FULL = `do $$ begin raise exception 'too little room on the disk' using errcode = '53100'; end $$`;

/**
 * One client of the embedded database.
 *
 * There is one backend, and it knows one unnamed statement, one portal and one transaction. A client therefore keeps the turn
 * from the first message of a query to the ReadyForQuery that leaves no transaction open; passing the messages of several
 * clients one by one would bind one client's parameters to another's statement.
 */
export class ClientSession {
  readonly #frames = new Frames();
  #answers: Uint8Array[] = [];
  #giveBack: (() => void) | null = null;
  #working: Promise<void> | null = null;
  #gone = false;
  /** Inside a query that has not been closed by a Sync yet. */
  #open = false;
  #wrote = false;
  #skipping = false;
  #idleTimer: NodeJS.Timeout | undefined;

  constructor(
    private readonly socket: Socket,
    private readonly shared: Shared,
    private readonly onFault: (error: unknown) => void,
  ) {
    socket.on('data', (bytes: Buffer) => {
      this.#frames.push(bytes);
      this.#work();
    });
    // A client that goes away is no fault; 'close' follows.
    socket.on('error', () => undefined);
    socket.on('close', () => {
      this.#gone = true;
      this.#work();
    });
  }

  /** Ends the connection once the query in hand is answered and its transaction, if any, rolled back. */
  async end(): Promise<void> {
    await this.#working;
    this.#gone = true;
    this.#work();
    await this.#working;
    this.socket.destroy();
  }

  #work(): void {
    if (this.#working !== null) return;
    clearTimeout(this.#idleTimer);
    this.#working = this.#run()
      .catch((error: unknown) => this.onFault(error))
      .finally(() => {
        this.#working = null;
        if (this.#gone && this.#giveBack !== null) this.#work();
      });
  }

  async #run(): Promise<void> {
    try {
      for (let message = this.#read(); message !== null; message = this.#read()) await this.#take(message);
      if (this.#gone) await this.#abandon();
      else if (this.#giveBack !== null) this.#startIdleTimer();
    } catch (error) {
      this.#giveBack?.();
      this.#giveBack = null;
      throw error;
    }
  }

  #read(): Message | null {
    if (this.#gone) return null;
    try {
      return this.#frames.next();
    } catch (error) {
      if (!(error instanceof RangeError)) throw error;
      this.#hangUp('08P01', error.message);
      return null;
    }
  }

  async #take(message: Message): Promise<void> {
    if (message.kind === 'encryption') this.socket.write('N');
    else if (message.kind === 'cancel' || message.type === 'X') this.#hangUp();
    else await this.#forward(message);
  }

  async #forward(message: Message): Promise<void> {
    this.#giveBack ??= await this.shared.turns.take();
    if (this.#gone) return;
    const closes = message.kind === 'startup' || 'QSF'.includes(message.type);
    this.#open = !closes;
    // Copied: the backend may use its buffer again for the next message.
    const answer = Uint8Array.from(await this.#execute(message));
    this.#answers.push(answer);
    if (closes) await this.#close(answer);
    else if (message.type === 'H') this.#send();
  }

  async #execute(message: Message): Promise<Uint8Array> {
    if (this.#skipping && message.type !== 'S') return new Uint8Array();
    this.#skipping = false;
    const sql = sqlOf(message);
    // A Bind may name a statement of an earlier query; only its own text would tell that it reads.
    const writes =
      sql === null ? message.type === 'B' && message.bytes[6 + message.bytes.indexOf(0, 5) - 5] !== 0 : mayWrite(sql);
    if (sql !== null && writes && !(await this.shared.hasRoom())) {
      this.#skipping = message.type === 'P';
      const refusal = await this.shared.backend.execProtocolRaw(queryMessage(DISK_FULL));
      return this.#skipping ? withoutReady(refusal) : refusal;
    }
    this.#wrote ||= writes;
    return this.shared.backend.execProtocolRaw(message.bytes);
  }

  /** The query is answered: between transactions the turn passes on, but not before what was written is safe. */
  async #close(answer: Uint8Array): Promise<void> {
    if (standingOf(answer) !== 'idle') {
      this.#send();
      return;
    }
    if (this.#wrote) await this.shared.synchronise();
    this.#wrote = false;
    this.#send();
    this.#giveBack?.();
    this.#giveBack = null;
  }

  #send(): void {
    const answers = this.#answers;
    this.#answers = [];
    if (!this.#gone && this.socket.writable) this.socket.write(Buffer.concat(answers));
  }

  /** The client is gone: whatever it left open is undone and the turn passes on. */
  async #abandon(): Promise<void> {
    if (this.#giveBack === null) return;
    if (this.#open) await this.shared.backend.execProtocolRaw(syncMessage());
    await this.shared.backend.execProtocolRaw(queryMessage('rollback'));
    // Part of it may have been committed before the client left.
    if (this.#wrote) await this.shared.synchronise();
    this.#giveBack();
    this.#giveBack = null;
  }

  #startIdleTimer(): void {
    this.#idleTimer = setTimeout(() => {
      this.#hangUp('25P03', 'a transaction was left open without a word; it was rolled back');
      this.#work();
    }, this.shared.idleLimitMs);
  }

  #hangUp(code?: string, text?: string): void {
    this.#gone = true;
    if (code !== undefined && text !== undefined && this.socket.writable) this.socket.end(fatalMessage(code, text));
    else this.socket.end();
  }
}
