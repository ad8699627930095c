import { describe, expect, it } from 'vitest';
import { board, control } from '@/tests/support/airframe';
import { hingeOperations, hingeProblems } from './hinge';

const codes = (over: Parameters<typeof control>[0], material = board()) =>
  hingeProblems(control(over), material, 'surfaces.0.controls.0').map(({ code, path }) => `${code} ${path}`);

describe('bevels', () => {
  // Down 12 degrees, neutral 3 down: the lower face closes by 15 and needs 25.
  const paper = (bottom: number) =>
    codes({
      throwsDeg: { up: 30, down: 12, lowShare: 0.7 },
      neutralDeg: 3,
      hinge: { kind: 'paper', side: 'upper', bevelDeg: [0, bottom] },
    });

  it('are at least 10 degrees more than the throw towards them, neutral counted in', () => {
    expect(paper(25)).toEqual([]);
    expect(paper(24.9)).toEqual(['bevel-too-small surfaces.0.controls.0.hinge.bevelDeg.1']);
  });

  it('count on the upper face when the hinge is on the lower', () => {
    const lower = (top: number) =>
      codes({
        throwsDeg: { up: 20, down: 30, lowShare: 0.7 },
        neutralDeg: 2,
        hinge: { kind: 'paper', side: 'lower', bevelDeg: [top, 0] },
      });
    expect(lower(28)).toEqual([]);
    expect(lower(27.9)).toEqual(['bevel-too-small surfaces.0.controls.0.hinge.bevelDeg.0']);
  });

  it('count on both faces of a tape hinge bevelled on both', () => {
    const tape = (top: number, bottom: number) =>
      codes({
        throwsDeg: { up: 15, down: 20, lowShare: 0.7 },
        hinge: { kind: 'tape', side: 'upper', bevelDeg: [top, bottom] },
      });
    expect(tape(25, 30)).toEqual([]);
    expect(tape(24, 29)).toHaveLength(2);
    expect(tape(0, 30)).toEqual([]);
  });

  it('are not asked of a flexing hinge, and paper is asked of a paper hinge', () => {
    expect(codes({ hinge: { kind: 'flexible', side: 'upper', bevelDeg: [0, 0] } }, board({ kind: 'epp' }))).toEqual([]);
    expect(codes({}, board({ kind: 'xps' }))).toEqual(['paper-hinge-needs-paper surfaces.0.controls.0.hinge.kind']);
  });
});

describe('operations', () => {
  const line = [
    [0, -70],
    [120, -75],
  ] as const;

  it('of a paper hinge are worked from the face opposite to the paper, and close it as the trailing edge goes down', () => {
    const { fixed, moving } = hingeOperations(control({ neutralDeg: 3 }), line, 5, '');
    expect(moving).toEqual([]);
    expect(fixed).toMatchObject([
      { kind: 'cutToPaper', face: 'lower', angleDeg: 3, path: line },
      { kind: 'bevel', face: 'lower', angleDeg: 40, depthMm: 5, path: line },
    ]);
  });

  it('of a paper hinge below open the upper face as the trailing edge goes down', () => {
    const { fixed } = hingeOperations(
      control({ neutralDeg: 3, hinge: { kind: 'paper', side: 'lower', bevelDeg: [40, 0] } }),
      line,
      5,
      '',
    );
    expect(fixed).toMatchObject([
      { kind: 'cutToPaper', face: 'upper', angleDeg: -3 },
      { kind: 'bevel', face: 'upper' },
    ]);
  });

  it('of a tape hinge bevel the control to the middle from both faces and tape both', () => {
    const { fixed, moving } = hingeOperations(
      control({ hinge: { kind: 'tape', side: 'upper', bevelDeg: [35, 45] } }),
      line,
      5,
      '',
    );
    expect(fixed.map(({ kind, face }) => `${kind} ${face}`)).toEqual(['tape upper', 'tape lower']);
    expect(moving).toMatchObject([
      { kind: 'bevel', face: 'upper', angleDeg: 35, depthMm: 2.5 },
      { kind: 'bevel', face: 'lower', angleDeg: 45, depthMm: 2.5 },
      { kind: 'tape', face: 'upper' },
      { kind: 'tape', face: 'lower' },
    ]);
  });
});
