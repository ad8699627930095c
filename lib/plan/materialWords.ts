import type { Material } from '@/lib/airframe/schema/stock';
import { materials as words } from '@/lib/text/en/elements';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';

/** What a material is called on paper: its kind in words, with its id where two sheets of one kind are equally thick. */
export function materialWords(
  materials: readonly Pick<Material, 'id' | 'kind' | 'thicknessMm'>[],
): (materialId: string) => string {
  return (materialId) => {
    const material = materials.find(({ id }) => id === materialId);
    if (!material) return materialId;
    const alike = materials.filter(
      ({ kind, thicknessMm }) => kind === material.kind && thicknessMm === material.thicknessMm,
    );
    const name = words[material.kind];
    return alike.length > 1 ? fill(plan.sheet.materialWithId, { name, id: materialId }) : name;
  };
}
