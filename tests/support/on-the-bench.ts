import type { Page } from 'playwright-core';

type PointPx = { x: number; y: number };

/** The first face of an open bench, with its whole image in view: places of the image are clicked as a person would. */
export class OpenBench {
  readonly #page: Page;
  readonly #image: { widthPx: number; heightPx: number };

  constructor(page: Page, image: { widthPx: number; heightPx: number }) {
    this.#page = page;
    this.#image = image;
  }

  /** Waits until every tile of the whole image is drawn. */
  async whole(): Promise<void> {
    await this.#page.locator('[data-face="first"][data-whole="true"]').waitFor();
  }

  async click(at: PointPx): Promise<void> {
    const { x, y } = await this.#onPage(at);
    await this.#page.mouse.move(x, y);
    await this.#page.mouse.down();
    await this.#page.mouse.up();
  }

  /** Sets the points of a chain and finishes it by setting the last one twice. */
  async chain(points: readonly PointPx[]): Promise<void> {
    for (const point of points) await this.click(point);
    const last = points.at(-1);
    if (last) await this.click(last);
  }

  async #onPage(at: PointPx): Promise<PointPx> {
    const box = await this.#page.locator('[data-face="first"]').boundingBox();
    if (!box) throw new Error('no face on the page');
    // the face has a border of a px on each side
    const [width, height] = [box.width - 2, box.height - 2];
    const scale = Math.min(width / this.#image.widthPx, height / this.#image.heightPx);
    return {
      x: box.x + 1 + width / 2 + (at.x - this.#image.widthPx / 2) * scale,
      y: box.y + 1 + height / 2 + (at.y - this.#image.heightPx / 2) * scale,
    };
  }
}
