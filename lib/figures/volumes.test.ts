import { describe, expect, it } from 'vitest';
import { fin, full, plain, tail, wing } from '@/tests/support/plainAircraft';

const foreplane = () => tail(-350, { id: 'fore', role: 'foreplane' });

describe('volumes and the simple neutral point where they do not fit', () => {
  it('a foreplane leaves the fin volume without a verdict, and says what is there instead of a tail', () => {
    const { values } = full(plain({ surfaces: [wing(), foreplane(), fin(150)] }));
    expect(values.tailVolumeV?.value).toBeGreaterThan(0);
    expect(values.tailVolumeV?.verdict).toBeUndefined();
    expect(values.tailVolumeH?.problem?.message).toContain('foreplane');
  });

  it('with a tail the fin volume is judged', () => {
    expect(full(plain()).values.tailVolumeV?.verdict).toBeDefined();
  });

  it('wings in tandem have no simple neutral point; wings above each other do', () => {
    const second = (x: number, z: number) =>
      wing({ id: 'second', controls: [], mount: { to: 'datum', at: [x, 0, z] } });
    const handbook = (x: number, z: number) =>
      full(plain({ surfaces: [wing(), second(x, z), fin(600)] })).values.neutralPointHandbookXMm;
    expect(handbook(500, 40)?.problem?.code).toBe('does-not-apply');
    expect(handbook(30, 150)?.value).toBeGreaterThan(0);
  });
});
