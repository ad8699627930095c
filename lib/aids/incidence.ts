import { elementName } from '@/lib/airframe/names';
import { hingeShares } from '@/lib/airframe/resolve';
import type { ResolvedSurface, Section } from '@/lib/airframe/resolved';
import { panelAt, sectionAt } from '@/lib/airframe/section';
import { degFromRad, lerp3, radFromDeg, type Vec3 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/aids';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { cradle, wedge } from './incidenceShapes';
import { onePiece, sideOn } from './piece';
import { type AidSource, sheetMm } from './source';

const words = texts.incidence;

/** Where a surface without twist is gauged, as a share of its length: clear of the body. */
const USUAL_STATION = 0.3;
/** A tip that is turned by less than this against the root gets no gauge of its own, degrees. */
const LEAST_TWIST_DEG = 0.25;
/** Reach of a gauge along the chord: from here, and as far as this or to just ahead of the controls; never longer than fits an offcut. */
const FROM_SHARE = 0.1;
const TO_SHARE = 0.75;
const AHEAD_OF_HINGE = 0.03;
const MOST_MM = 260;

interface Wanted {
  readonly key: string;
  readonly name: string;
  readonly surface: ResolvedSurface;
  readonly station: number;
  /** What the far edge of the gauge is level with: the datum, or another surface's chord, leading edge up positive. */
  readonly againstDeg: number;
  /** Set against the gauge's reference. */
  readonly setDeg: number;
  /** The surface whose chord is the reference. */
  readonly other: string | null;
  readonly more: readonly string[];
}

/** The angle of a section's chord in a side view, leading edge up positive: what a level on a gauge sees. */
const seenDeg = ({ le, te }: Section): number => degFromRad(Math.atan2(le[2] - te[2], te[0] - le[0]));

const angleWords = (deg: number): string => {
  const shown = trimmedDigits(Math.abs(deg), 2);
  if (shown === '0') return words.level;
  return fill(deg > 0 ? words.up : words.down, { deg: shown });
};

/** How far back a gauge may stand on the chord without touching a control. */
function lastShare({ surface }: ResolvedSurface, station: number): number {
  const hinges = surface.controls
    .filter(({ kind, from, to }) => kind !== 'allMoving' && from <= station && to >= station)
    .flatMap((control) => hingeShares(control));
  return Math.max(FROM_SHARE + 0.15, Math.min(TO_SHARE, ...hinges.map((share) => share - AHEAD_OF_HINGE)));
}

function gauge(source: AidSource, wanted: Wanted): Part {
  const { surface, station, againstDeg, setDeg, other } = wanted;
  const section = sectionAt(surface, station);
  const { panel } = panelAt(surface, station);
  const slope = Math.tan(radFromDeg(seenDeg(section) - againstDeg));
  const flat = panel.panel.section.kind === 'flat';
  const stationMm = trimmedDigits(section.lengthMm, 0);
  const half =
    sheetMm(source.airframe, panel.panel.materialId) / 2 / Math.max(0.2, Math.cos(radFromDeg(panel.rollDeg)));
  const along = Math.min((lastShare(surface, station) - FROM_SHARE) * section.chordMm, MOST_MM);
  const outline = flat
    ? wedge(along, slope)
    : cradle(section.chordMm * Math.cos(radFromDeg(seenDeg(section) - againstDeg)), slope);
  const foot: Vec3 = flat ? lerp3(section.le, section.te, FROM_SHARE) : section.le;
  const level = flat
    ? other === null
      ? words.topLevel
      : fill(words.topAlong, { other })
    : other === null
      ? words.bottomLevel
      : fill(words.bottomAlong, { other });
  return onePiece({
    key: wanted.key,
    name: wanted.name,
    about: [angleWords(setDeg), fill(flat ? words.sits : words.holds, { station: stationMm }), level, ...wanted.more],
    material: source.material,
    outline,
    frame: turned(againstDeg, [foot[0], foot[1], foot[2] + (flat ? half : 0)]),
  });
}

/** Side on, with its x axis along a chord of that incidence. */
function turned(incidenceDeg: number, origin: Vec3): Part['frame'] {
  if (incidenceDeg === 0) return sideOn(origin);
  const [c, s] = [Math.cos(radFromDeg(incidenceDeg)), Math.sin(radFromDeg(incidenceDeg))];
  return { origin, ex: [c, 0, -s], ey: [s, 0, c] };
}

const isTail = ({ surface }: ResolvedSurface): boolean =>
  surface.role === 'tailplane' || surface.role === 'foreplane' || surface.role === 'vtail';

const hasTwist = ({ surface }: ResolvedSurface): boolean => surface.panels.some(({ washoutDeg }) => washoutDeg !== 0);

function wantedFor(source: AidSource, surface: ResolvedSurface, tail: ResolvedSurface | undefined): Wanted[] {
  const { id, incidenceDeg, role } = surface.surface;
  const name = elementName(source.airframe, id);
  const station = hasTwist(surface) ? 0 : USUAL_STATION;
  const tip = sectionAt(surface, 1);
  const isWing = role === 'wing' && tail !== undefined;
  const tailDeg = tail?.surface.incidenceDeg ?? 0;
  const other = tail ? elementName(source.airframe, tail.surface.id) : '';
  const datum = { surface, againstDeg: 0, other: null, more: [] };
  return [
    {
      ...datum,
      key: `aid/incidence/${id}`,
      name: fill(words.name, { surface: name }),
      station,
      setDeg: incidenceDeg,
      more: isWing && tailDeg === 0 ? [fill(words.alsoDecalage, { other })] : [],
    },
    ...(Math.abs(tip.incidenceDeg - incidenceDeg) >= LEAST_TWIST_DEG && tip.chordMm > 40
      ? [
          {
            ...datum,
            key: `aid/incidence/${id}-tip`,
            name: fill(words.tipName, { surface: name }),
            station: 1,
            setDeg: tip.incidenceDeg,
          },
        ]
      : []),
    ...(isWing && tailDeg !== 0
      ? [
          {
            ...datum,
            key: `aid/incidence/${id}-decalage`,
            name: fill(words.decalageName, { surface: name, other }),
            station,
            againstDeg: tailDeg,
            setDeg: incidenceDeg - tailDeg,
            other,
          },
        ]
      : []),
  ];
}

/**
 * A gauge for each flying surface that is not upright: it stands on the chord, and its far edge is level with the datum when the incidence is
 * right. A twisted surface gets one for its tip; a wing with a tail that is not level, one for the decalage.
 */
export function incidenceGauges(source: AidSource): Part[] {
  const rows = new Set(source.setUp.incidences.map(({ id }) => id));
  const surfaces = source.resolved.surfaces.filter(({ surface }) => rows.has(surface.id));
  const tail = surfaces.find(isTail);
  const wing = surfaces.find(({ surface }) => surface.role === 'wing');
  return surfaces
    .flatMap((surface) => wantedFor(source, surface, surface === wing ? tail : undefined))
    .map((wanted) => gauge(source, wanted));
}
