import type { StoreApi } from 'zustand/vanilla';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Figures } from '@/lib/figures/types';
import type { Vec3 } from '@/lib/numerics/vec';
import { cgNow, type Places } from '../sheet/cg';
import { placesOf, type Scene, sceneOf } from '../sheet/scene';
import type { BoardState } from './board';
import { current } from './session';

/** The picture of the present airframe, worked out once per airframe, with the time that took. */
export function sceneMemo(store: StoreApi<BoardState>) {
  let scene: Scene | null = null;
  let ms = 0;
  return {
    ms: () => ms,
    of: (airframe: Airframe): Scene => (scene?.airframe === airframe ? scene : sceneOf(airframe)),
    scene(): Scene {
      const airframe = current(store.getState());
      if (scene?.airframe !== airframe) {
        const begun = performance.now();
        scene = sceneOf(airframe);
        ms = performance.now() - begun;
      }
      return scene;
    },
  };
}

/** The CG of the moment, worked out once per picture and figures. */
export function cgMemo(store: StoreApi<BoardState>, scene: () => Scene): () => Vec3 | null {
  let of: { readonly figures: Figures; readonly scene: Scene; readonly cg: Vec3 | null } | null = null;
  let then: { readonly airframe: Airframe; readonly places: Places } | null = null;
  return () => {
    const { figures, figuresOf } = store.getState();
    if (figures === null || figuresOf === null) return null;
    const now = scene();
    if (of?.figures === figures && of.scene === now) return of.cg;
    if (figuresOf === now.airframe) then = { airframe: figuresOf, places: now.places };
    if (then?.airframe !== figuresOf) then = { airframe: figuresOf, places: placesOf(figuresOf) };
    of = { figures, scene: now, cg: cgNow(figures.masses, then.places, now.places) };
    return of.cg;
  };
}
