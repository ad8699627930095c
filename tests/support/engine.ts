import { ENGINE_VERSION } from '@/lib/figures/engine';
import { artefactsOf, freeze, planOf } from '@/scripts/cli/chain';
import type { Engine } from '@/server/context';
import { planFonts } from './fonts';

/** The command line's own functions in this process, for tests that are not about the process around them. */
export const chainEngine: Engine = async (request) => {
  switch (request.kind) {
    case 'freeze': {
      const frozen = freeze(request.airframe);
      return frozen.ok
        ? { ok: true, kind: 'freeze', engine: ENGINE_VERSION, frozen: frozen.value }
        : { ok: false, problems: frozen.problems };
    }
    case 'plan': {
      const made = await planOf(request, artefactsOf(request), request.paper, planFonts);
      if (!made.ok) return { ok: false, problems: made.problems };
      const pdfBase64 = Buffer.from(made.value.pdf).toString('base64');
      return { ok: true, kind: 'plan', pdfBase64, manifest: made.value.manifest };
    }
  }
};
