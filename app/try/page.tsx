import type { Metadata } from 'next';
import { layoutChoices } from '@/app/loaders';
import { TryLoader } from '@/components/editor/TryLoader';
import { tryOut } from '@/lib/text/en/board';

export const metadata: Metadata = { title: tryOut.title };

export default function TryPage() {
  return <TryLoader layouts={layoutChoices()} />;
}
