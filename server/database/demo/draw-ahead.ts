import { draw } from '../../imaging/image-pool.ts';
import type { CaseView } from './views.ts';

// Drawing takes one core while the tiles of the image before are cut on the other.
const aheadOfTheOneAsked = 2;

/** Draws the views in the order they will be asked for, a little ahead of the asking. */
export class DrawnAhead {
  readonly #order: readonly CaseView[];
  readonly #drawing = new Map<string, Promise<Uint8Array>>();

  constructor(order: readonly CaseView[]) {
    this.#order = order;
  }

  take(view: CaseView): Promise<Uint8Array> {
    const at = this.#order.findIndex(({ fileName }) => fileName === view.fileName);
    const asked = this.#begin(view);
    for (const next of this.#order.slice(at + 1, at + 1 + aheadOfTheOneAsked))
      void this.#begin(next).catch(() => undefined);
    this.#drawing.delete(view.fileName);
    return asked;
  }

  #begin(view: CaseView): Promise<Uint8Array> {
    const { fileName, spec, format } = view;
    const begun = this.#drawing.get(fileName) ?? draw({ spec, format, density: format === 'tiff' });
    this.#drawing.set(fileName, begun);
    return begun;
  }
}
