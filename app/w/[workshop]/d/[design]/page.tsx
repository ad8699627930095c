import type { Metadata } from 'next';
import { BoardLoader } from '@/components/editor/BoardLoader';
import { board } from '@/lib/text/en/board';
import { boardPage } from './loaders';

export const metadata: Metadata = { title: board.title };

type Params = Promise<{ workshop: string; design: string }>;

export default async function BoardPage({ params }: { readonly params: Params }) {
  const { workshop, design } = await params;
  const { draft, latest, may } = await boardPage(workshop, design);
  return (
    <BoardLoader
      key={design}
      place={{ workshopId: workshop, designId: design }}
      draft={draft}
      latest={latest}
      may={may}
    />
  );
}
