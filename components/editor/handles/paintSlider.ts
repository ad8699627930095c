import type { Handle } from '@/lib/airframe/handles';
import type { Vec2 } from '@/lib/numerics/vec';
import type { UnitSystem } from '@/lib/units/quantity';
import { valueText } from './valueText';

const setWhenChanged = (element: Element, name: string, value: string) => {
  if (element.getAttribute(name) !== value) element.setAttribute(name, value);
};

/** Brings a slider's button to its place and tells its reader the value. Touches only what changed. */
export function paintSlider(button: HTMLElement, handle: Handle, at: Vec2, system: UnitSystem): void {
  const transform = `translate(${at[0].toFixed(2)}px, ${at[1].toFixed(2)}px)`;
  if (button.style.transform !== transform) button.style.transform = transform;
  setWhenChanged(button, 'aria-valuenow', String(handle.value));
  setWhenChanged(button, 'aria-valuemin', String(handle.min));
  setWhenChanged(button, 'aria-valuemax', String(handle.max));
  setWhenChanged(button, 'aria-valuetext', valueText(handle.value, handle.unit, system));
}

/** How far the grip's bar turns on the screen so that it stands across the way it moves, degrees. The view turns y up. */
export const gripTurnDeg = ([x, y]: Vec2): number => (Math.atan2(-y, x) * 180) / Math.PI;
