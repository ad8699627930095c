import type { ViewOutline } from '@/lib/airframe/outlines';

// What lies lower in the stack is drawn first; a control lies on its surface, equipment shows through.
const ORDER: readonly ViewOutline['kind'][] = ['gear', 'boom', 'body', 'surface', 'control', 'item', 'drive'];

/** Back to front. */
export const inDrawingOrder = (outlines: readonly ViewOutline[]): readonly ViewOutline[] =>
  [...outlines].sort((a, b) => ORDER.indexOf(a.kind) - ORDER.indexOf(b.kind));
