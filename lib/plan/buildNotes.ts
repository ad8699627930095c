import { controlWithin, elementName } from '@/lib/airframe/names';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Tube } from '@/lib/airframe/schema/stock';
import type { Control, Surface } from '@/lib/airframe/schema/surface';
import type { SetUpSheet } from '@/lib/figures/setUp';
import { radioRows, thrustText } from '@/lib/figures/setUpWords';
import type { Figures } from '@/lib/figures/types';
import type { SheetLayout } from '@/lib/layout/types';
import type { Development } from '@/lib/parts/types';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { materialWords } from './materialWords';
import { moveWords } from './throwRows';

// What a builder gathers and sets besides the parts, one line each, for the first page.

const words = plan.build;

export interface BuildNotes {
  /** Sheets by kind, then tubes and rods. */
  readonly need: readonly string[];
  /** Rates and expo, neutral settings, thrust lines, and where the pack goes; throws where no table of them can be made. */
  readonly setUp: readonly string[];
}

function sheetNeeds(airframe: Airframe, layout: SheetLayout): string[] {
  const counts = new Map<string, number>();
  const nameOf = materialWords(airframe.materials);
  for (const { materialId, thicknessMm, wMm, hMm } of layout.sheets) {
    const text = fill(words.sheet, {
      material: nameOf(materialId),
      thickness: trimmedDigits(thicknessMm, 2),
      w: trimmedDigits(wMm, 1),
      h: trimmedDigits(hMm, 1),
    });
    counts.set(text, (counts.get(text) ?? 0) + 1);
  }
  return [...counts].map(([text, count]) => fill(words.counted, { count, what: text }));
}

/** "4/2 mm tube": the kind of a tube with its cross-section. */
export function tubeWords({ kind, outerMm, innerMm }: Pick<Tube, 'kind' | 'outerMm' | 'innerMm'>): string {
  const [w, h] = outerMm.map((mm) => trimmedDigits(mm, 2));
  switch (kind) {
    case 'tube':
      return fill(plan.tubes.tube, { outer: w ?? '', inner: trimmedDigits(innerMm?.[0] ?? 0, 2) });
    case 'rod':
      return fill(plan.tubes.rod, { outer: w ?? '' });
    case 'strip':
    case 'foamBox':
      return fill(plan.tubes[kind], { w: w ?? '', h: h ?? '' });
  }
}

function tubeNeeds(airframe: Airframe, development: Development): string[] {
  return development.stockPieces.map(({ tubeId, name, lengthMm, count }) => {
    const tube = airframe.tubes.find(({ id }) => id === tubeId);
    const kind = tube ? tubeWords(tube) : tubeId;
    const text = fill(words.tube, { kind, length: trimmedDigits(lengthMm, 1), name, id: tubeId });
    return fill(words.counted, { count, what: text });
  });
}

const deg = (angle: number): string => trimmedDigits(Math.abs(angle), 1);

/** Throws as the document has them: all there is where the figures hold no set-up sheet. */
function controlNotes(airframe: Airframe, surface: Surface, control: Control): string[] {
  const { up, down, lowShare } = control.throwsDeg;
  const name = fill(words.control, {
    surface: elementName(airframe, surface.id),
    control: controlWithin(surface, control),
  });
  const throws = fill(words.throws, {
    control: name,
    up: deg(up),
    upLow: deg(up * lowShare),
    down: deg(down),
    downLow: deg(down * lowShare),
  });
  if (control.neutralDeg === 0) return [throws];
  // Positive is trailing edge down, as for a throw that adds lift.
  const neutral = control.neutralDeg < 0 ? words.neutralUp : words.neutralDown;
  return [throws, fill(neutral, { control: name, angle: deg(control.neutralDeg) })];
}

function documentNotes(airframe: Airframe): string[] {
  const notes = airframe.surfaces.flatMap((surface) =>
    surface.controls.flatMap((control) => controlNotes(airframe, surface, control)),
  );
  return notes.length > 0 ? [...notes, words.rates, words.setUpMissing] : [];
}

/** What is set beside the throws of the table. */
function sheetNotes(sheet: SetUpSheet): string[] {
  const { controls } = sheet;
  if (controls.length === 0) return [];
  const raised = controls
    .filter(({ neutral }) => neutral.way !== 'none')
    .map(({ surface, control, neutral }) =>
      fill(words.neutral, { control: fill(words.control, { surface, control }), move: moveWords(neutral) }),
    );
  return [...radioRows(sheet).map(({ text }) => text), ...(raised.length > 0 ? raised : [words.neutralLevel])];
}

const thrustNotes = (airframe: Airframe): string[] =>
  airframe.drives.map(({ id, thrustDeg: [downDeg, rightDeg] }) =>
    thrustText({ name: elementName(airframe, id), downDeg, rightDeg }),
  );

/** Where packs go, from the line on which the aircraft is to balance: a place that can be marked and touched. */
function packNotes(airframe: Airframe, figures: Figures | null): string[] {
  const cgXMm = figures?.marks.firstFlightCgXMm;
  const resolved = resolve(airframe);
  if (cgXMm === undefined || cgXMm === null || !resolved.ok) return [];
  const move = figures?.values.packFirstFlightMm?.verdict;
  const places = airframe.items.flatMap(({ id, kind, slide }) => {
    const place = resolved.value.places.get(id);
    if (kind !== 'pack' || !place) return [];
    const aftMm = place.at[0] - cgXMm;
    const where = fill(words.pack, {
      pack: elementName(airframe, id),
      mm: trimmedDigits(Math.abs(aftMm), 0),
      way: aftMm < 0 ? words.ahead : words.behind,
    });
    if (!slide) return [where];
    const reach = {
      fore: trimmedDigits(Math.max(0, -slide.fromMm), 0),
      aft: trimmedDigits(Math.max(0, slide.toMm), 0),
    };
    return [where, fill(words.packSlides, reach)];
  });
  return places.length > 0 && move ? [...places, fill(words.packMove, { words: move.words })] : places;
}

/** The lines of the first page beside figures and throws. The pack's place follows from an estimate. */
export function buildNotes(
  airframe: Airframe,
  development: Development,
  layout: SheetLayout,
  figures: Figures | null,
): BuildNotes {
  const sheet = figures?.setUp;
  const tubes = tubeNeeds(airframe, development);
  return {
    need: [...sheetNeeds(airframe, layout), ...(tubes.length > 0 ? tubes : [words.noTube])],
    setUp: [
      ...(sheet ? sheetNotes(sheet) : documentNotes(airframe)),
      ...thrustNotes(airframe),
      ...packNotes(airframe, figures),
    ],
  };
}
