import { header as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import type { UnitSystem } from '@/lib/units/quantity';
import { LinkButton } from '../ui/Button';
import type { paths } from '../ui/paths';

interface UnitsLinkProps {
  readonly path: ReturnType<(typeof paths)['figures' | 'setUp']>;
  readonly system: UnitSystem;
}

/** The way to the same page in the other units: a link, so that it works before any script does. */
export function UnitsLink({ path, system }: UnitsLinkProps) {
  const other = system === 'metric' ? 'imperial' : 'metric';
  const label = fill(texts.units, { system: texts[system], other: texts[other] });
  return (
    <LinkButton href={`${path}?units=${other}`} aria-label={label} className="figure">
      {texts[system]}
    </LinkButton>
  );
}
