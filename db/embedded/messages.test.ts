import { describe, expect, it } from 'vitest';
import {
  bindsNamed,
  Frames,
  LONGEST_MESSAGE,
  type Message,
  queryMessage,
  sqlOf,
  standingOf,
  withoutReady,
} from './messages';

// Byte layouts after the PostgreSQL documentation, "Frontend/Backend Protocol", "Message Formats".

const typed = (type: string, body: string): Buffer => {
  const bytes = Buffer.alloc(5 + Buffer.byteLength(body));
  bytes.write(type, 'latin1');
  bytes.writeInt32BE(4 + Buffer.byteLength(body), 1);
  bytes.write(body, 5);
  return bytes;
};
const opening = (code: number, rest = ''): Buffer => {
  const bytes = Buffer.alloc(8 + rest.length);
  bytes.writeInt32BE(bytes.length, 0);
  bytes.writeInt32BE(code, 4);
  bytes.write(rest, 8);
  return bytes;
};
const STARTUP = opening(196608, 'user\0postgres\0\0');

function started(): Frames {
  const frames = new Frames();
  frames.push(STARTUP);
  frames.next();
  return frames;
}

const asMessage = (bytes: Buffer): Message => ({ kind: 'typed', type: String.fromCharCode(bytes.readUInt8(0)), bytes });

describe('Frames', () => {
  it('takes the messages apart wherever the stream was cut', () => {
    const stream = Buffer.concat([
      opening(80877103),
      STARTUP,
      typed('P', 'a\0select 1\0\0\0'),
      typed('S', ''),
      queryMessage('select 2'),
    ]);
    for (let cut = 1; cut < stream.length; cut += 1) {
      const frames = new Frames();
      const seen: string[] = [];
      for (const piece of [stream.subarray(0, cut), stream.subarray(cut)]) {
        frames.push(piece);
        for (let message = frames.next(); message !== null; message = frames.next())
          seen.push(message.type || message.kind);
      }
      expect(seen, `cut at ${cut}`).toEqual(['encryption', 'startup', 'P', 'S', 'Q']);
    }
  });

  it('refuses what is not this protocol', () => {
    const http = new Frames();
    http.push(Buffer.from('GET / HTTP/1.1\r\n\r\n'));
    expect(() => http.next()).toThrow(RangeError);
    const old = new Frames();
    old.push(opening(131072));
    expect(() => old.next()).toThrow('unknown protocol 131072');
  });

  it('refuses a message that claims an absurd length, before it has arrived', () => {
    const frames = started();
    const head = Buffer.alloc(5);
    head.write('Q');
    head.writeInt32BE(LONGEST_MESSAGE, 1);
    frames.push(head);
    expect(() => frames.next()).toThrow(RangeError);
    const negative = started();
    negative.push(Buffer.from([0x51, 0xff, 0xff, 0xff, 0xff]));
    expect(() => negative.next()).toThrow(RangeError);
  });
});

describe('reading messages', () => {
  it('finds the SQL of a query and of a statement with and without a name', () => {
    expect(sqlOf(asMessage(queryMessage('select é')))).toBe('select é');
    expect(sqlOf(asMessage(typed('P', '\0insert into t values ($1)\0\0\0')))).toBe('insert into t values ($1)');
    expect(sqlOf(asMessage(typed('P', 'named\0delete from t\0\0\0')))).toBe('delete from t');
    expect(sqlOf(asMessage(typed('S', '')))).toBeNull();
  });

  it('tells a Bind of a named statement', () => {
    expect(bindsNamed(asMessage(typed('B', '\0\0\0\0\0\0\0\0')))).toBe(false);
    expect(bindsNamed(asMessage(typed('B', 'portal\0\0\0\0\0\0\0\0')))).toBe(false);
    expect(bindsNamed(asMessage(typed('B', '\0named\0\0\0\0\0\0\0')))).toBe(true);
    expect(bindsNamed(asMessage(typed('E', '\0named\0')))).toBe(false);
  });

  it('reads where the backend stands from the end of its answer', () => {
    const answer = Buffer.concat([typed('C', 'SELECT 1\0'), typed('Z', 'T')]);
    expect(standingOf(answer)).toBe('inTransaction');
    expect(standingOf(typed('Z', 'I'))).toBe('idle');
    expect(standingOf(typed('Z', 'E'))).toBe('failed');
    expect(standingOf(typed('C', 'SELECT 1\0'))).toBeNull();
    expect(standingOf(new Uint8Array())).toBeNull();
    expect(Buffer.from(withoutReady(answer))).toEqual(typed('C', 'SELECT 1\0'));
  });
});
