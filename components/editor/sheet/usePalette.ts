import { useSyncExternalStore } from 'react';
import { dark, light, type Palette } from '@/lib/look/tokens';

const DARK = '(prefers-color-scheme: dark)';

function subscribe(changed: () => void): () => void {
  const device = window.matchMedia(DARK);
  const chosen = new MutationObserver(changed);
  device.addEventListener('change', changed);
  chosen.observe(document.documentElement, { attributes: true, attributeFilter: ['data-look'] });
  return () => {
    device.removeEventListener('change', changed);
    chosen.disconnect();
  };
}

/** The look that the page has: the person's choice, else the device's. */
function paletteNow(): Palette {
  const chosen = document.documentElement.dataset.look;
  if (chosen === 'light') return light;
  if (chosen === 'dark') return dark;
  return window.matchMedia(DARK).matches ? dark : light;
}

/** The canvas's colours, following the page's look. */
export const usePalette = (): Palette => useSyncExternalStore(subscribe, paletteNow, () => light);
