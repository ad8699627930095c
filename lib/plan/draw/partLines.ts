import { placePath } from '@/lib/layout/turns';
import type { Placement } from '@/lib/layout/types';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Operation, Part } from '@/lib/parts/types';
import type { DrawnLine } from '../drawing';

/** Half the size of the cross that marks a point to be pinned through, mm. */
const PIN_MM = 3;

const cross = (id: string, part: Part, [x, y]: Vec2): DrawnLine[] => {
  const line = (name: string, points: Vec2[]): DrawnLine => ({
    id: `${id}-${name}`,
    type: 'register',
    partKey: part.key,
    points,
    closed: false,
  });
  return [
    line('x', [
      [x - PIN_MM, y],
      [x + PIN_MM, y],
    ]),
    line('y', [
      [x, y - PIN_MM],
      [x, y + PIN_MM],
    ]),
  ];
};

const operationLines = (part: Part, operation: Operation, placement: Placement): DrawnLine[] => {
  const id = `${part.key}#${operation.id}`;
  const points = placePath(operation.path, placement);
  const [first] = points;
  if (!first) return [];
  if (points.length === 1) return cross(id, part, first);
  return [{ id, type: operation.kind, partKey: part.key, points, closed: operation.closed }];
};

/** A placed part's outline, holes and operations as lines on the sheet, mm. A path of one point becomes a small cross. */
export function partLines(part: Part, placement: Placement): DrawnLine[] {
  const ring = (id: string, points: readonly Vec2[]): DrawnLine => ({
    id: `${part.key}#${id}`,
    type: 'cut',
    partKey: part.key,
    points: placePath(points, placement),
    closed: true,
  });
  return [
    ring('outline', part.outline),
    ...part.holes.map((hole, i) => ring(`hole-${i + 1}`, hole)),
    ...part.operations.flatMap((operation) => operationLines(part, operation, placement)),
  ];
}
