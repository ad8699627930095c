'use client';

import { setUp as texts } from '@/lib/text/en/figurePages';
import { Button } from '../ui/Button';

/** Opens the browser's own way to print. */
export const PrintButton = () => (
  <Button weight="primary" onClick={() => window.print()}>
    {texts.print}
  </Button>
);
