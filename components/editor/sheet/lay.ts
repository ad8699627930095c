import type { FrameLoop } from '../state/frames';
import { type Extents, foldSheet, outgrown, type Sheet, type SheetRoom } from './fold';

/** Where the sheet lies in the window. It follows the aircraft while nobody has zoomed or moved it, but never under a hand. */
export function layOfSheet(frames: FrameLoop, extents: () => Extents) {
  let sheet: Sheet | null = null;
  let room: SheetRoom | null = null;
  let byHand = false;
  const toRoom = () => {
    if (room !== null && room.width > 0 && room.height > 0) sheet = foldSheet(room, extents());
    byHand = false;
    frames.request();
  };
  return {
    sheet: () => sheet,
    fit: toRoom,
    resize(next: SheetRoom) {
      room = next;
      toRoom();
    },
    lay(next: Sheet) {
      sheet = next;
      byHand = true;
      frames.request();
    },
    rested() {
      if (sheet !== null && !byHand && outgrown(sheet, extents())) toRoom();
    },
  };
}
