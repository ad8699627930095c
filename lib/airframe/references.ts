import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { placeElements } from './mounts';
import type { Airframe } from './schema/airframe';

// Every id is its own, and every id that is named exists. Assumes that the shape holds.

const words = texts.problems;

interface Named {
  readonly id: string;
  readonly path: string;
}

const named = (list: readonly { readonly id: string }[], path: string): Named[] =>
  list.map(({ id }, index) => ({ id, path: `${path}.${index}` }));

/** Groups in which no id may be used twice: the elements and stock of the document, and what each surface and body holds. */
export function idScopes(airframe: Airframe): Named[][] {
  const document = (
    ['materials', 'tubes', 'coverings', 'surfaces', 'bodies', 'booms', 'drives', 'items', 'gear', 'joints'] as const
  ).flatMap((key) => named(airframe[key], key));
  const surfaces = airframe.surfaces.map((surface, index) =>
    (['panels', 'cutouts', 'ribs', 'spars', 'controls'] as const).flatMap((key) =>
      named(surface[key], `surfaces.${index}.${key}`),
    ),
  );
  const bodies = airframe.bodies.map((body, index) =>
    (['stations', 'doublers', 'formers', 'openings'] as const).flatMap((key) =>
      named(body[key], `bodies.${index}.${key}`),
    ),
  );
  return [document, ...surfaces, ...bodies];
}

function checkIds(scope: readonly Named[]): Problem[] {
  const first = new Map<string, string>();
  return scope.flatMap(({ id, path }): Problem[] => {
    if (id === 'datum') return [{ code: 'reserved-id', path: `${path}.id`, message: words.reservedId }];
    const other = first.get(id);
    if (other === undefined) {
      first.set(id, path);
      return [];
    }
    const message = fill(words.duplicateId, { id, other: `${other}.id` });
    return [{ code: 'duplicate-id', path: `${path}.id`, message, fix: words.duplicateIdFix }];
  });
}

type Expected = 'material' | 'tube' | 'covering' | 'servo' | 'controller' | 'pack' | 'element';

interface Reference {
  readonly id: string | undefined;
  readonly to: Expected;
  readonly path: string;
}

function surfaceReferences(airframe: Airframe): Reference[] {
  return airframe.surfaces.flatMap((surface, s) => {
    const base = `surfaces.${s}`;
    const panels = surface.panels.flatMap((panel, p): Reference[] => {
      const path = `${base}.panels.${p}`;
      const layers: Reference[] =
        panel.section.kind === 'stepped'
          ? panel.section.layers.map((layer, l) => ({
              id: layer.materialId,
              to: 'material',
              path: `${path}.section.layers.${l}.materialId`,
            }))
          : [];
      return [
        { id: panel.materialId, to: 'material', path: `${path}.materialId` },
        { id: panel.coveringId, to: 'covering', path: `${path}.coveringId` },
        ...layers,
      ];
    });
    const spars = surface.spars.flatMap((spar, index): Reference[] => [
      { id: spar.tubeId, to: 'tube', path: `${base}.spars.${index}.tubeId` },
      { id: spar.materialId, to: 'material', path: `${base}.spars.${index}.materialId` },
    ]);
    const servos = surface.controls.map(
      (control, index): Reference => ({
        id: control.linkage?.servoItemId,
        to: 'servo',
        path: `${base}.controls.${index}.linkage.servoItemId`,
      }),
    );
    return [...panels, ...spars, ...servos];
  });
}

function otherReferences(airframe: Airframe): Reference[] {
  const bodies = airframe.bodies.flatMap((body, b): Reference[] => [
    { id: body.materialId, to: 'material', path: `bodies.${b}.materialId` },
    ...(['doublers', 'formers'] as const).flatMap((key) =>
      body[key].map(
        (piece, index): Reference => ({
          id: piece.materialId,
          to: 'material',
          path: `bodies.${b}.${key}.${index}.materialId`,
        }),
      ),
    ),
  ]);
  const drives = airframe.drives.flatMap((drive, index): Reference[] => [
    { id: drive.controllerItemId, to: 'controller', path: `drives.${index}.controllerItemId` },
    { id: drive.packItemId, to: 'pack', path: `drives.${index}.packItemId` },
  ]);
  return [
    ...bodies,
    ...airframe.booms.map((boom, index): Reference => ({ id: boom.tubeId, to: 'tube', path: `booms.${index}.tubeId` })),
    ...airframe.gear.map((leg, index): Reference => ({ id: leg.tubeId, to: 'tube', path: `gear.${index}.tubeId` })),
    ...drives,
    ...airframe.joints.flatMap((joint, index) =>
      joint.between.map((id, end): Reference => ({ id, to: 'element', path: `joints.${index}.between.${end}` })),
    ),
  ];
}

function knownIds(airframe: Airframe, to: Expected): string[] {
  const ids = (list: readonly { readonly id: string }[]) => list.map(({ id }) => id);
  switch (to) {
    case 'material':
      return ids(airframe.materials);
    case 'tube':
      return ids(airframe.tubes);
    case 'covering':
      return ids(airframe.coverings);
    case 'servo':
    case 'controller':
    case 'pack':
      return ids(airframe.items.filter(({ kind }) => kind === to));
    case 'element':
      return [
        airframe.surfaces,
        airframe.bodies,
        airframe.booms,
        airframe.drives,
        airframe.items,
        airframe.gear,
      ].flatMap(ids);
  }
}

function checkReference({ id, to, path }: Reference, airframe: Airframe, known: readonly string[]): Problem[] {
  if (id === undefined || known.includes(id)) return [];
  const item =
    to === 'servo' || to === 'controller' || to === 'pack' ? airframe.items.find((one) => one.id === id) : undefined;
  if (item) {
    return [
      { code: 'wrong-item-kind', path, message: fill(words.wrongItemKind, { id, got: item.kind, expected: to }) },
    ];
  }
  const message = fill(words.unknownReference, { what: to, id });
  const fix =
    known.length > 0
      ? fill(words.unknownReferenceFix, { known: known.join(', ') })
      : fill(words.noneToRefer, { what: to });
  return [{ code: 'unknown-reference', path, message, fix }];
}

/** Problems of ids and references: duplicates by name, unknown materials, tubes, coverings, items, elements, and mounts (unknown or in a loop). */
export function checkReferences(airframe: Airframe): Problem[] {
  const known = new Map<Expected, string[]>();
  const knownTo = (to: Expected) => {
    const ids = known.get(to) ?? knownIds(airframe, to);
    known.set(to, ids);
    return ids;
  };
  const references = [...surfaceReferences(airframe), ...otherReferences(airframe)];
  const joints = airframe.joints.flatMap(({ between: [a, b] }, index): Problem[] =>
    a === b
      ? [
          {
            code: 'joint-with-itself',
            path: `joints.${index}.between`,
            message: fill(words.jointWithItself, { id: a }),
          },
        ]
      : [],
  );
  return [
    ...idScopes(airframe).flatMap(checkIds),
    ...references.flatMap((reference) => checkReference(reference, airframe, knownTo(reference.to))),
    ...joints,
    ...placeElements(airframe).problems,
  ];
}
