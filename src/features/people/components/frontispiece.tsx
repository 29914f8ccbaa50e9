import type { ReactNode } from 'react';
import frontispiece from '#src/theme/frontispiece.webp';
import { FrontispieceLayout } from '#src/shell/frontispiece-layout.tsx';

/** The opening leaf with its plate, for whoever is not signed in. */
export function Frontispiece({ children }: { children: ReactNode }) {
  return (
    <FrontispieceLayout
      image={
        <img
          src={frontispiece}
          alt="A fracture surface in grey: a dark origin at the lower edge, a smooth mirror round it, mist and hackle beyond."
        />
      }
      caption="Glass, broken in bend. Origin below, Wallner lines across the mirror, mist, hackle."
    >
      {children}
    </FrontispieceLayout>
  );
}
