'use client';

import type Konva from 'konva/lib/Core.js';
import { useCallback, useRef } from 'react';
import { Layer, Shape, Stage } from 'react-konva/lib/ReactKonvaCore.js';
import { sheet as texts } from '@/lib/text/en/board';
import { useBoard, usePainter } from '../useBoard';
import { type Picture, paintSheet } from './paintSheet';
import { usePalette } from './usePalette';

const LABELS = {
  plan: texts.plan,
  side: texts.side,
  front: texts.front,
  mac: texts.mac,
  cg: texts.cg,
  np: texts.np,
  range: texts.range,
  rule: texts.ruleUnits,
};

const samePicture = (one: Picture, other: Picture): boolean =>
  one.sheet === other.sheet &&
  one.scene === other.scene &&
  one.marks === other.marks &&
  one.selected === other.selected &&
  one.palette === other.palette &&
  one.system === other.system;

/** The drawing itself: one shape on one canvas, drawn anew when its picture changed. The page's readers get text instead. */
export function SheetCanvas({ width, height }: { readonly width: number; readonly height: number }) {
  const board = useBoard();
  const palette = usePalette();
  const layer = useRef<Konva.Layer>(null);
  const drawn = useRef<Picture | null>(null);

  const picture = useCallback((): Picture | null => {
    const sheet = board.sheet();
    if (sheet === null) return null;
    const { figures, selected, system } = board.store.getState();
    const marks = figures?.marks ?? null;
    return { sheet, scene: board.scene(), marks, cg: board.cg(), selected, palette, system, labels: LABELS };
  }, [board, palette]);

  const paint = useCallback(
    (context: Konva.Context) => {
      const next = picture();
      if (next === null) return;
      drawn.current = next;
      paintSheet(context._context, next);
    },
    [picture],
  );

  usePainter(() => {
    const next = picture();
    if (next === null || (drawn.current !== null && samePicture(drawn.current, next))) return;
    layer.current?.draw();
  });

  return (
    <div aria-hidden="true" className="absolute inset-0">
      <Stage width={width} height={height} listening={false}>
        <Layer ref={layer} listening={false}>
          <Shape sceneFunc={paint} listening={false} />
        </Layer>
      </Stage>
    </div>
  );
}
