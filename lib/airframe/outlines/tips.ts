import { type Edges, rakedTip, roundedTip } from '@/lib/geometry/tip';
import { dot3, lerp3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import type { ResolvedPanel } from '../resolved';
import type { Surface } from '../schema/surface';
import { chordDirection } from '../section';

/** A panel's edges laid flat: x outboard at right angles to the root chord, y forward. */
function flatEdges({ root, tip, rollDeg }: ResolvedPanel): Edges {
  const aft = chordDirection(root.incidenceDeg, rollDeg);
  const span = sub3(tip.le, root.le);
  const out = sub3(span, scale3(aft, dot3(span, aft)));
  const size = Math.sqrt(dot3(out, out));
  const place = (p: Vec3): Vec2 => {
    const from = sub3(p, root.le);
    return [dot3(from, out) / size, -dot3(from, aft)];
  };
  return { le: [place(root.le), place(tip.le)], te: [place(root.te), place(tip.te)] };
}

function shaped(edges: Edges, tip: Surface['tip']): Edges | null {
  switch (tip.shape) {
    case 'square':
      return null;
    case 'raked':
      return tip.angleDeg === 0 ? null : rakedTip(edges, tip.angleDeg);
    case 'rounded':
      return roundedTip(edges, tip.radiusMm);
    case 'outline':
      // Cut square so far, so drawn square.
      return null;
  }
}

/** Leading and trailing edge of a surface's outermost panel from root to tip, its tip cut to shape. */
export function tippedPanel(
  panel: ResolvedPanel,
  tip: Surface['tip'],
): readonly [le: readonly Vec3[], te: readonly Vec3[]] {
  const { root, tip: end } = panel;
  const edges = flatEdges(panel);
  const cut = shaped(edges, tip);
  if (!cut)
    return [
      [root.le, end.le],
      [root.te, end.te],
    ];
  const [[le0, le1], [te0, te1]] = [edges.le, edges.te];
  if (!le0 || !le1 || !te0 || !te1) throw new RangeError('a panel has two sections');
  const heightOn = (a: Vec2, b: Vec2, x: number): number => a[1] + ((b[1] - a[1]) * (x - a[0])) / (b[0] - a[0]);
  // Back by place along both edges and between them: a twisted panel keeps its twist.
  const lift = (p: Vec2): Vec3 => {
    const [high, low] = [heightOn(le0, le1, p[0]), heightOn(te0, te1, p[0])];
    const fore = lerp3(root.le, end.le, (p[0] - le0[0]) / (le1[0] - le0[0]));
    const aft = lerp3(root.te, end.te, (p[0] - te0[0]) / (te1[0] - te0[0]));
    return high === low ? fore : lerp3(fore, aft, (high - p[1]) / (high - low));
  };
  return [
    [root.le, ...cut.le.slice(1).map(lift)],
    [root.te, ...cut.te.slice(1).map(lift)],
  ];
}
