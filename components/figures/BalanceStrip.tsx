import type { FigureMarks } from '@/lib/figures/types';
import { sheet } from '@/lib/text/en/review';
import { fixedDigits } from '@/lib/units/number';
import { CgSign, NpSign } from '../thumbnail/signs';
import { Value } from '../ui/Value';
import { ruler } from './ruler';

interface BalanceStripProps {
  /** The stretch of the aircraft's x that the rule covers: the drawing's above it, so that both line up. */
  readonly fromMm: number;
  readonly toMm: number;
  readonly marks: FigureMarks;
  readonly label: string;
}

/** The balance rule, still: where MAC, CG range, CG and neutral point lie along the aircraft. */
export function BalanceStrip({ fromMm, toMm, marks, label }: BalanceStripProps) {
  const at = (x: number) => `${((x - fromMm) / (toMm - fromMm)) * 100}%`;
  const { major, minor } = ruler(fromMm, toMm);
  const { mac, cgRangeXMm, cg, neutralPointXMm } = marks;
  return (
    <figure className="grid gap-2" aria-label={label}>
      <div className="relative h-12 overflow-hidden border border-t-0 border-rule bg-paper" aria-hidden="true">
        <svg aria-hidden="true" className="absolute inset-0 size-full" stroke="var(--ink-soft)">
          {minor.map((x) => (
            <line key={`minor ${x}`} x1={at(x)} x2={at(x)} y1="0" y2="5" />
          ))}
          {major.map((x) => (
            <line key={x} x1={at(x)} x2={at(x)} y1="0" y2="10" />
          ))}
          {mac === null ? null : (
            <line
              x1={at(mac.leXMm)}
              x2={at(mac.leXMm + mac.lengthMm)}
              y1="37.5"
              y2="37.5"
              stroke="var(--air)"
              strokeWidth="2"
            />
          )}
          {cgRangeXMm === null ? null : (
            <line
              x1={at(cgRangeXMm[0])}
              x2={at(cgRangeXMm[1])}
              y1="37.5"
              y2="37.5"
              stroke="var(--air)"
              strokeWidth="11"
              strokeOpacity="0.35"
            />
          )}
        </svg>
        {major.map((x) => (
          <span
            key={x}
            style={{ left: at(x) }}
            className="figure absolute top-2.5 -translate-x-1/2 text-xs text-ink-soft"
          >
            {x}
          </span>
        ))}
        {neutralPointXMm === null ? null : (
          <span style={{ left: at(neutralPointXMm) }} className="absolute top-[29px] -translate-x-1/2 text-air">
            <NpSign />
          </span>
        )}
        {cg === null ? null : (
          <span style={{ left: at(cg[0]) }} className="absolute top-[29px] -translate-x-1/2 text-mass">
            <CgSign />
          </span>
        )}
      </div>
      <Legend marks={marks} />
    </figure>
  );
}

/** The same in numbers. */
function Legend({ marks: { mac, cgRangeXMm, cg, neutralPointXMm } }: Pick<BalanceStripProps, 'marks'>) {
  return (
    <figcaption className="flex flex-wrap gap-x-6 gap-y-1 text-sm">
      {cg === null ? null : <Entry name={sheet.cg} text={fixedDigits(cg[0], 0)} sign={<CgSign />} tone="text-mass" />}
      {cgRangeXMm === null ? null : (
        <Entry
          name={sheet.range}
          text={`${fixedDigits(cgRangeXMm[0], 0)} to ${fixedDigits(cgRangeXMm[1], 0)}`}
          tone="text-air"
        />
      )}
      {neutralPointXMm === null ? null : (
        <Entry name={sheet.np} text={fixedDigits(neutralPointXMm, 0)} sign={<NpSign />} tone="text-air" />
      )}
      {mac === null ? null : <Entry name={sheet.mac} text={fixedDigits(mac.lengthMm, 0)} tone="text-air" />}
    </figcaption>
  );
}

interface EntryProps {
  readonly name: string;
  readonly text: string;
  readonly tone: string;
  readonly sign?: React.ReactNode;
}
function Entry({ name, text, tone, sign }: EntryProps) {
  return (
    <span className="flex items-center gap-1.5">
      <span className={`flex items-center gap-1.5 font-[560] ${tone}`}>
        {sign}
        {name}
      </span>
      <Value text={text} unit="mm" />
    </span>
  );
}
