import type { Folded } from '@/lib/airframe/foldedSection';
import { controlWithin } from '@/lib/airframe/names';
import type { ResolvedControl, ResolvedPanel, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Material, Tube } from '@/lib/airframe/schema/stock';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import { scale3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/foldedParts';
import { texts as common } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { bothSides, centrePart, type Draft } from '../../draft';
import { clipOperations } from '../../shape/clip';
import { mirror2, mirrorRing } from '../../shape/ring';
import type { Operation, Part, StockPiece } from '../../types';
import { type BoomHere, boomsOn } from '../boom';
import type { MovingPiece } from '../controlledSheet';
import type { Seam } from '../joint';
import { panelFrame, type Run } from '../run';
import { surfaceName } from '../spar';
import { freedSkin, settledFrame } from './foldedControls';
import { type LaidOut, laidOut } from './layOut';
import type { Skin } from './skin';
import { skinWork, webLines } from './skinWork';
import type { Web } from './web';

/** What a folded panel is cut beside, and from. */
interface FoldedFittings {
  readonly controls: readonly ResolvedControl[];
  readonly materials: ReadonlyMap<string, Material>;
  readonly tubes: ReadonlyMap<string, Tube>;
  readonly booms: readonly BoomHere[];
}

interface Made {
  readonly parts: readonly Part[];
  readonly stockPieces: readonly StockPiece[];
  readonly problems: readonly Problem[];
}

const nothing = (problems: readonly Problem[]): Made => ({ parts: [], stockPieces: [], problems });

type Words = 'skin' | 'upper' | 'lower' | 'web' | 'rearWeb';
const SKIN_WORDS = { whole: 'skin', upper: 'upper', lower: 'lower' } as const;
const SKIN_KEYS = { whole: 'skin', upper: 'skin-upper', lower: 'skin-lower' } as const;

/** A part's name: its surface's, and its panel's where there are several. */
function nameOf(run: Run, words: Words): Draft['name'] {
  const { surface, panels } = run.surface;
  const whole = surfaceName(surface);
  const panel = run.panels.map((entry) => entry.panel.id).join(' + ');
  const place = panels.length > 1 ? fill(texts.names.panel, { surface: whole, panel }) : whole;
  const part = fill(texts.names[words], { surface: place });
  return (side) => (side === 'centre' ? part : fill(texts.names.onSide, { part, side: common.sides[side] }));
}

/** A skin is worked on its inner face, and drawn as it is seen there. */
const seenInside = (draft: Draft): Draft => ({
  ...draft,
  outline: mirrorRing(draft.outline),
  operations: draft.operations.map((operation) => ({ ...operation, path: operation.path.map(mirror2) })),
  frame: { ...draft.frame, ex: scale3(draft.frame.ex, -1) },
  faces: [draft.faces[1], draft.faces[0]],
});

/** A part of this panel before its sides. */
function draftOf(run: Run, key: string, words: Words, shape: Pick<Draft, 'outline' | 'operations' | 'frame'>): Draft {
  const { surface } = run.surface;
  return {
    ...shape,
    key: `${surface.id}/${run.panels.map(({ panel }) => panel.id).join('+')}/${key}`,
    name: nameOf(run, words),
    elementId: surface.id,
    material: run.material,
    holes: [],
    faces: ['outer', 'inner'],
    grainDeg: 0,
  };
}

function movingDraft(run: Run, { control, outline, operations }: MovingPiece, frame: Draft['frame']): Draft {
  const { surface } = run.surface;
  const values = { surface: surfaceName(surface), control: controlWithin(surface, control.control) };
  return {
    key: `${surface.id}/${control.control.id}/control`,
    name: (side) =>
      side === 'centre'
        ? fill(common.names.control, values)
        : fill(common.names.controlSide, { ...values, side: common.sides[side] }),
    elementId: control.control.id,
    material: run.material,
    outline,
    holes: [],
    operations,
    frame: settledFrame(control, frame, run.material.thicknessMm),
    faces: ['upper', 'lower'],
    grainDeg: 0,
  };
}

function skinDrafts(made: LaidOut, skin: Skin, { controls, booms }: FoldedFittings) {
  const { run, shell, seams, edging, stands, webs, spars } = made;
  const has = (end: Seam['end']): boolean => seams.some((seam) => seam.end === end);
  const own = skin.which === 'lower' ? [] : controls;
  const freed = freedSkin(run, shell, skin, own, { root: has('root'), tip: has('tip') });
  const lower = shell.faces.at(-1);
  const onLower = skin.which === 'upper' || !lower ? [] : boomsOn({ ...run, frame: lower.frame }, freed.outline, booms);
  const work = [
    ...skinWork(run, shell, skin, seams, edging),
    ...webLines(shell, skin, webs.spar, stands.spar, 'web'),
    ...webLines(shell, skin, webs.rear, stands.rear, 'rearWeb'),
    ...spars.work
      .filter(({ skin: on }) => skin.which === 'whole' || skin.which === on)
      .map(({ operation }) => operation),
    ...onLower.map(fromBelow),
  ];
  const operations = [...clipOperations(work, freed.outline, []), ...freed.operations];
  return {
    fixed: seenInside(
      draftOf(run, SKIN_KEYS[skin.which], SKIN_WORDS[skin.which], {
        outline: freed.outline,
        operations,
        frame: skin.frame,
      }),
    ),
    moving: freed.moving.map((piece) => movingDraft(run, piece, freed.frame)),
    problems: freed.problems,
  };
}

/** A boom over the outside of the lower skin is above its sheet as that lies. */
const fromBelow = (operation: Operation): Operation => ({
  ...operation,
  face: operation.face === 'upper' ? 'outer' : 'inner',
});

const webDraft = (run: Run, web: Web, key: string, words: 'web' | 'rearWeb'): Draft =>
  draftOf(run, key, words, { outline: web.outline, operations: web.operations, frame: web.frame });

/** What the surface asks of a folded panel that cannot be done yet. */
function surfaceProblems(run: Run, controls: readonly ResolvedControl[]): Problem[] {
  const { surface, index, panels } = run.surface;
  const [panel] = run.panels;
  if (!panel) return [];
  const { root, tip } = panel;
  const cutouts = surface.cutouts.flatMap(({ outline }, i): Problem[] => {
    const stations = outline.map(([station]) => station);
    const here = Math.max(...stations) > root.station && Math.min(...stations) < tip.station;
    return here ? [notBuiltYet(`surfaces.${index}.cutouts.${i}`, texts.notBuilt.cutouts)] : [];
  });
  const last = panel.index === panels.length - 1;
  const odd = last && (surface.tip.shape === 'rounded' || surface.tip.shape === 'outline');
  const turning = panel.index === 0 && controls.some(({ control }) => control.kind === 'allMoving');
  return [
    ...cutouts,
    ...(odd ? [notBuiltYet(`surfaces.${index}.tip.shape`, texts.notBuilt.tip)] : []),
    ...(turning ? [notBuiltYet(`surfaces.${index}.controls`, texts.notBuilt.turning)] : []),
  ];
}

function panelParts(run: Run, section: Folded, fittings: FoldedFittings): Made {
  const { surface, index } = run.surface;
  const own = fittings.controls.filter(({ surfaceId }) => surfaceId === surface.id);
  const path = `surfaces.${index}.panels.${run.panels[0]?.index ?? 0}.section`;
  const { made, problems } = laidOut(run, section, fittings.tubes, path);
  const asked = surfaceProblems(run, own);
  if (!made) return nothing([...problems, ...asked]);
  const { spar, rear } = made.webs;
  const skins = made.skins.map((skin) => skinDrafts(made, skin, { ...fittings, controls: own }));
  const drafts = [
    ...skins.map(({ fixed }) => fixed),
    ...(spar ? [webDraft(run, spar, 'web', 'web')] : []),
    ...(rear ? [webDraft(run, rear, 'rear-web', 'rearWeb')] : []),
    ...skins.flatMap(({ moving }) => moving),
  ];
  return {
    parts: drafts.flatMap((draft) => (surface.mirrored ? bothSides(draft) : [centrePart(draft)])),
    stockPieces: made.spars.stockPieces,
    problems: [...problems, ...skins.flatMap((skin) => skin.problems), ...asked],
  };
}

/**
 * Parts of a surface's folded panels: each its skin (one sheet folded round the leading edge, or an upper and a lower one), its webs and
 * the controls that are pieces of their own. What cannot be folded is a problem at its field; the rest still comes. mm, degrees.
 */
export function foldedParts(
  resolved: ResolvedSurface,
  panels: readonly ResolvedPanel[],
  fittings: FoldedFittings,
): Made {
  const made = panels.flatMap((panel): Made[] => {
    const { section, materialId } = panel.panel;
    const material = fittings.materials.get(materialId);
    if (section.kind !== 'folded' || !material) return [];
    return [
      panelParts(
        { surface: resolved, panels: [panel], centre: false, material, frame: panelFrame(panel) },
        section,
        fittings,
      ),
    ];
  });
  return {
    parts: made.flatMap(({ parts }) => parts),
    stockPieces: made.flatMap(({ stockPieces }) => stockPieces),
    problems: made.flatMap(({ problems }) => problems),
  };
}
