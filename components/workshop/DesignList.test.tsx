import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { DesignSummary } from '@/lib/contract/answers';
import type { Role } from '@/lib/contract/roles';
import { DesignList } from './DesignList';

const design = (latestRevision: DesignSummary['latestRevision']): DesignSummary => ({
  id: 'd1',
  name: 'Tarrel 620',
  updatedAt: '2026-03-04T10:00:00.000Z',
  latestRevision,
  spanMm: 619.6,
  massG: 281.4,
  thumbnail: {
    outlines: [
      [
        [0, 0],
        [100, 0],
        [100, 310],
      ],
    ],
  },
});
const RELEASED = { number: 3, state: 'held', releasedAt: '2026-03-01T10:00:00.000Z' } as const;

const show = (roles: readonly Role[], latest: DesignSummary['latestRevision']) =>
  renderToStaticMarkup(<DesignList workshopId="w1" designs={[design(latest)]} roles={roles} />);

describe('DesignList', () => {
  it('shows where the newest revision stands, span and mass in whole units', () => {
    const html = show(['reviewer'], RELEASED);
    expect(html).toContain('Revision 3');
    expect(html).toContain('on hold');
    expect(html).toContain('>620<');
    expect(html).toContain('>281<');
  });
  it('opens the board for a designer; others look at it', () => {
    expect(show(['designer'], null)).toContain('Open the board');
    expect(show(['builder', 'reviewer'], null)).not.toContain('Open the board');
    expect(show(['builder'], null)).toContain('Look at the draft');
  });
  it('leads to the review and the print of the newest revision', () => {
    expect(show(['reviewer'], RELEASED)).toContain('href="/w/w1/d/d1/r/3"');
    expect(show(['builder'], RELEASED)).toContain('href="/w/w1/d/d1/r/3/print"');
  });
  it('offers the draft for printing to builders and designers alone, while nothing is released', () => {
    expect(show(['builder'], null)).toContain('href="/w/w1/d/d1/print"');
    expect(show(['owner', 'reviewer'], null)).not.toContain('href="/w/w1/d/d1/print"');
    expect(show(['builder'], RELEASED)).not.toContain('href="/w/w1/d/d1/print"');
  });
});
