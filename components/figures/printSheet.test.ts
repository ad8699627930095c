import { expect, it } from 'vitest';
import { light } from '@/lib/look/tokens';
import { PRINT_SHEET } from './printSheet';

it('prints every colour of the house in black or white, the grounds white', () => {
  const set = new Map([...PRINT_SHEET.matchAll(/--([a-z-]+):(black|white)/g)].map(([, name, value]) => [name, value]));
  const names = Object.keys(light).map((name) => name.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`));
  expect([...set.keys()].sort()).toEqual(names.sort());
  expect([set.get('board'), set.get('paper'), set.get('ink')]).toEqual(['white', 'white', 'black']);
});
