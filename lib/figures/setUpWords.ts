import { setUp as words } from '@/lib/text/en/setUp';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { EdgeMove, SetUpControl, SetUpLinkage, SetUpSheet, StickEnd, StickMove } from './setUp';

// The set-up sheet in words: rows to be ticked, under headings. Screen and paper show the same.

export interface SetUpRow {
  /** Steady, so that a tick finds its row again. */
  readonly id: string;
  readonly text: string;
}

export interface SetUpSection {
  readonly title: string;
  readonly rows: readonly SetUpRow[];
}

const one = (value: number): string => trimmedDigits(value, 1);
const pct = (share: number): string => trimmedDigits(100 * share, 0);
const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
const wayWords = ({ way, deg }: EdgeMove): string => fill(words.ways[way], { deg: one(deg) });
const endWords = (move: EdgeMove): string => fill(words.end, { way: wayWords(move), mm: one(move.mm) });

/** Rates and expo, as they are set in the transmitter. */
export function radioRows({ lowRate, expo }: SetUpSheet): SetUpRow[] {
  return [
    { id: 'radio/rate', text: fill(words.lowRate, { pct: pct(lowRate) }) },
    { id: 'radio/expo', text: expo > 0 ? fill(words.expo, { pct: pct(expo) }) : words.noExpo },
  ];
}

/** Both ends of one stick at each rate. */
function throwRows({ id, throws }: SetUpControl): SetUpRow[] {
  const sticks = [...new Set(throws.map(({ stick }) => stick))];
  return sticks.flatMap((stick) => {
    const ends = throws.filter((end) => end.stick === stick);
    const list = (move: (end: StickEnd) => EdgeMove | null): string =>
      ends
        .flatMap((end) => move(end) ?? [])
        .map(endWords)
        .join(', ');
    const [high, low] = [list((end) => end.high), list((end) => end.low)];
    const name = words.sticks[stick];
    if (low === '') return [{ id: `${id}/${stick}`, text: fill(words.fixed, { stick: name, ends: high }) }];
    return [
      { id: `${id}/${stick}/high`, text: fill(words.high, { stick: name, ends: high }) },
      { id: `${id}/${stick}/low`, text: fill(words.low, { stick: name, ends: low }) },
    ];
  });
}

function linkageTexts(linkage: SetUpLinkage | null): string[] {
  if (!linkage) return [words.noLinkage];
  const { armMm, hornMm, servo, rod, travel } = linkage;
  const holes = { arm: one(armMm), horn: one(hornMm) };
  return [
    servo === null ? fill(words.suggested, holes) : fill(words.linkage, { ...holes, servo }),
    ...(rod
      ? [
          fill(words.rod, {
            stuff: words.stuff[rod.stuff],
            diameter: one(rod.diameterMm),
            length: trimmedDigits(rod.lengthMm, 0),
          }),
        ]
      : []),
    travel
      ? fill(words.travel, {
          up: trimmedDigits(travel.upDeg, 0),
          down: trimmedDigits(travel.downDeg, 0),
          pct: trimmedDigits(travel.usedPct, 0),
        })
      : words.deadCentre,
  ];
}

function controlSection(control: SetUpControl): SetUpSection {
  const { id, surface, neutral, widestMm, differential, mirrored } = control;
  const text = (name: string, words: string): SetUpRow => ({ id: `${id}/${name}`, text: words });
  return {
    title: fill(mirrored ? words.both : words.control, { surface, control: capital(control.control) }),
    rows: [
      text(
        'neutral',
        neutral.way === 'none'
          ? words.neutralLevel
          : fill(words.neutral, { way: wayWords(neutral), mm: one(neutral.mm) }),
      ),
      ...throwRows(control),
      text('widest', fill(words.widest, { mm: one(widestMm) })),
      ...(differential > 0 ? [text('differential', fill(words.differential, { pct: pct(differential) }))] : []),
      ...linkageTexts(control.linkage).map((line, i) => text(`linkage/${i}`, line)),
    ],
  };
}

function moveRow({ id, control }: SetUpControl, move: StickMove, limit: number): SetUpRow {
  const [first, second] = move.sticks.map((stick) => words.full[stick]);
  const sticks = second === undefined ? (first ?? '') : fill(words.together, { one: first ?? '', other: second });
  const sides = move.sides
    .map((side) => fill(words.sideMove, { side: fill(words.sides[side.side], { control }), way: wayWords(side) }))
    .join(', ');
  const values = { sticks: capital(sticks), sides };
  return {
    id: `${id}/way/${move.sticks.join('+')}`,
    text: move.overShared ? fill(words.moveOver, { ...values, limit: one(limit) }) : fill(words.move, values),
  };
}

const deg = (value: number): string => one(Math.abs(value));

/** Which way a motor points, as a sentence. */
export const thrustText = ({ name, downDeg, rightDeg }: Omit<SetUpSheet['thrusts'][number], 'id'>): string =>
  downDeg === 0 && rightDeg === 0
    ? fill(words.thrustNone, { name })
    : fill(words.thrust, {
        name,
        down: fill(downDeg < 0 ? words.thrustUp : words.thrustDown, { deg: deg(downDeg) }),
        right: fill(rightDeg < 0 ? words.thrustLeft : words.thrustRight, { deg: deg(rightDeg) }),
      });

function angleRows({ incidences, thrusts }: SetUpSheet): SetUpRow[] {
  const incidence = (value: number) =>
    value === 0 ? words.incidenceNone : value > 0 ? words.incidenceUp : words.incidenceDown;
  return [
    ...incidences.map((one) => ({
      id: `${one.id}/incidence`,
      text: fill(incidence(one.deg), { name: one.name, deg: deg(one.deg) }),
    })),
    ...thrusts.map((one) => ({ id: `${one.id}/thrust`, text: thrustText(one) })),
  ];
}

/** The sheet under its headings, in the order of the work: transmitter, each control, directions and mixes, angles. */
export function setUpSections(sheet: SetUpSheet): SetUpSection[] {
  const directions = sheet.controls.flatMap((control) =>
    control.moves.map((move) => moveRow(control, move, sheet.sharedThrowDeg)),
  );
  return [
    { title: words.radio, rows: radioRows(sheet) },
    ...sheet.controls.map(controlSection),
    { title: words.directions, rows: directions },
    { title: words.angles, rows: angleRows(sheet) },
  ].filter(({ rows }) => rows.length > 0);
}
