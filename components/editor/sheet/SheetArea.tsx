'use client';

import { type PointerEvent, useEffect, useRef, useState } from 'react';
import type { Vec2 } from '@/lib/numerics/vec';
import { rule, sheet as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { shownText } from '@/lib/units/quantity';
import { GestureBubble } from '../handles/GestureBubble';
import { HandleLayer } from '../handles/HandleLayer';
import { MassLayer } from '../handles/MassLayer';
import { useBoard, useBoardState } from '../useBoard';
import { inBox, mmFromScreen, panSheet, zoomSheet } from './fold';
import { elementAt } from './hit';
import { SheetCanvas } from './SheetCanvas';
import { SheetTools } from './SheetTools';

/** Width of the docked slip with its margins, px; the drawing keeps clear of it. */
const SLIP_PX = 292;
/** From this width on the slip is docked on the sheet: the same as the page's medium breakpoint. */
const DOCKED = '(min-width: 800px)';
/** A press that moves less than this, px, is a click. */
const CLICK_PX = 4;
/** How near a line counts as hit, px. */
const REACH_PX = 6;
const ZOOM_PER_PX = 0.0016;

/** The sheet in its window: drawing, handles over it, and the tools that move it. */
export function SheetArea() {
  const board = useBoard();
  const area = useRef<HTMLDivElement>(null);
  const [size, setSize] = useState({ width: 0, height: 0 });
  const ground = useGround();

  useEffect(() => {
    const element = area.current;
    if (element === null) return;
    const measure = () => {
      const { clientWidth: width, clientHeight: height } = element;
      if (width === 0 || height === 0) return;
      setSize({ width, height });
      board.resize({ width, height, insetRight: window.matchMedia(DOCKED).matches ? SLIP_PX : 0 });
    };
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    // Wheel events are passive in React; a zoom has to keep the page from scrolling.
    const wheel = (event: WheelEvent) => {
      const sheet = board.sheet();
      if (sheet === null || (!event.ctrlKey && !window.matchMedia(DOCKED).matches)) return;
      event.preventDefault();
      const box = element.getBoundingClientRect();
      const factor = Math.exp(-event.deltaY * ZOOM_PER_PX);
      board.lay(zoomSheet(sheet, factor, [event.clientX - box.left, event.clientY - box.top]));
    };
    element.addEventListener('wheel', wheel, { passive: false });
    return () => {
      observer.disconnect();
      element.removeEventListener('wheel', wheel);
    };
  }, [board]);

  return (
    <section aria-label={texts.region} className="contents">
      <div
        ref={area}
        data-sheet
        data-testid="sheet"
        className="relative h-[64dvh] min-h-[420px] min-w-0 overflow-hidden bg-board md:h-full md:min-h-0"
      >
        <div className="absolute inset-0 touch-pan-y md:touch-none" {...ground}>
          {size.width > 0 ? <SheetCanvas width={size.width} height={size.height} /> : null}
        </div>
        <HandleLayer />
        <MassLayer />
        <GestureBubble />
        <SheetTools />
        <RuleInWords />
      </div>
    </section>
  );
}

/** On a narrow page a finger on the board scrolls the page. */
const pans = (event: PointerEvent<HTMLElement>): boolean =>
  event.pointerType === 'mouse' || window.matchMedia(DOCKED).matches;

/** The bare board under the handles: a click selects what lies there, a drag moves the sheet. */
function useGround() {
  const board = useBoard();
  const press = useRef<{ readonly from: Vec2; last: Vec2; moved: boolean } | null>(null);
  const placeOf = (event: PointerEvent<HTMLElement>): Vec2 => {
    const box = event.currentTarget.getBoundingClientRect();
    return [event.clientX - box.left, event.clientY - box.top];
  };
  return {
    onPointerDown(event: PointerEvent<HTMLElement>) {
      if (event.button !== 0) return;
      const at = placeOf(event);
      press.current = { from: at, last: at, moved: false };
      if (pans(event)) event.currentTarget.setPointerCapture(event.pointerId);
    },
    onPointerMove(event: PointerEvent<HTMLElement>) {
      const held = press.current;
      const sheet = board.sheet();
      if (held === null || sheet === null || !pans(event)) return;
      const at = placeOf(event);
      if (!held.moved && Math.hypot(at[0] - held.from[0], at[1] - held.from[1]) < CLICK_PX) return;
      held.moved = true;
      board.lay(panSheet(sheet, [at[0] - held.last[0], at[1] - held.last[1]]));
      held.last = at;
    },
    onPointerUp(event: PointerEvent<HTMLElement>) {
      const held = press.current;
      press.current = null;
      const sheet = board.sheet();
      if (held === null || held.moved || sheet === null) return;
      const at = placeOf(event);
      const { plan, side, front } = board.scene();
      const views = [
        { view: sheet.plan, outlines: plan },
        { view: sheet.side, outlines: side },
        { view: sheet.front, outlines: front },
      ];
      const under = views.find(({ view }) => view !== null && inBox(view.box, at));
      if (!under?.view) return;
      const hit = elementAt(under.outlines, mmFromScreen(under.view, at), REACH_PX / sheet.scale);
      if (hit !== null) board.select(hit);
    },
    onPointerCancel() {
      press.current = null;
    },
  };
}

/** The balance rule for whoever does not see it: the same places in words. */
function RuleInWords() {
  const marks = useBoardState((state) => state.settled?.marks ?? null);
  const system = useBoardState((state) => state.system);
  const mm = (value: number | null | undefined) =>
    value === null || value === undefined ? rule.unknown : shownText(value, 'mm', 0, system);
  const range = marks?.cgRangeXMm;
  return (
    <p className="sr-only" data-testid="rule-words">
      {rule.title}:{' '}
      {fill(rule.whole, {
        mac: mm(marks?.mac?.lengthMm),
        macLe: mm(marks?.mac?.leXMm),
        range: range ? fill(rule.between, { fore: mm(range[0]), aft: mm(range[1]) }) : rule.unknown,
        cg: mm(marks?.cg?.[0]),
        np: mm(marks?.neutralPointXMm),
      })}
    </p>
  );
}
