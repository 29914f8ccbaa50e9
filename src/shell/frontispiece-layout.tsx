import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { ProductMark } from '../ui/glyphs/product-mark.tsx';

type FrontispieceLayoutProps = {
  /** The fracture surface at the left: an `img` or `canvas` that fills its frame, with words for a screen reader. */
  image: ReactNode;
  /** What is seen on it, after "Frontispiece". */
  caption: ReactNode;
  /** The column at the right, under the product's name. */
  children: ReactNode;
};

/** The opening leaf for whoever is not signed in: a fracture surface at the left, one column at the right. */
export function FrontispieceLayout({ image, caption, children }: FrontispieceLayoutProps) {
  return (
    <main id="content" className="grid min-h-screen grid-cols-2 narrow:flex narrow:flex-col">
      <figure className="relative flex min-h-[220px] flex-col bg-plate narrow:h-[220px] narrow:flex-none">
        <div className="relative min-h-0 flex-1 overflow-hidden [&>*]:absolute [&>*]:inset-0 [&>*]:size-full [&>*]:object-cover [&>*]:object-[50%_100%]">
          {image}
        </div>
        <figcaption className="flex min-h-12 items-center px-6 py-2 text-s text-on-plate-2 narrow:hidden">
          <span>
            <b className="mr-2 font-serif text-[14.5px] font-medium text-on-plate italic">Frontispiece</b>
            {caption}
          </span>
        </figcaption>
      </figure>
      <div className="flex flex-1 items-center justify-center bg-sheet px-4 py-7 narrow:items-start">
        <div className="w-full max-w-[400px]">
          <h1>
            <Link
              to="/"
              className="flex items-center gap-3 font-serif text-[32px]/none font-semibold tracking-[-0.015em] text-ink no-underline"
            >
              <ProductMark size={34} />
              Hacklebook
            </Link>
          </h1>
          <p className="mt-[9px] mb-[34px] font-serif text-[17px]/[1.4] text-ink-2 italic">
            The casebook of the fracture laboratory.
          </p>
          {children}
        </div>
      </div>
    </main>
  );
}
