// Synthetic fracture surfaces: drawn by rule from a seed, for the demo cases and for tests that must know the truth.

/** What starts the crack. A surface flaw is drawn as half an ellipse standing on the tensile edge. */
export type SyntheticFlawKind =
  'pore' | 'agglomerate' | 'surface-crack' | 'grinding-crack' | 'impact-scratch' | 'edge-chip' | 'pit';

export type SyntheticFlaw = {
  kind: SyntheticFlawKind;
  /** Half-axis into the section, µm, > 0. */ halfAxisDepthUm: number;
  /** Half-axis along the tensile edge, µm, > 0. */ halfAxisAlongUm: number;
};

/** A flaw beside the origin that started nothing. */
export type Bystander = SyntheticFlaw & {
  /** Along the tensile edge from the origin, µm, positive to the right of the first face. */ alongUm: number;
  /** Below the tensile edge, µm, ≥ 0. */ depthUm: number;
};

/** glass: bare mirror; fine: dense ceramic; coarse: grains and pores show; porous: nothing but grains and pores. */
export type BodyTexture = 'glass' | 'fine' | 'coarse' | 'porous';

/** Outline of the broken section round the origin, µm. */
export type SyntheticSection = {
  /** Tensile edge to the far side, > 0. */ heightUm: number;
  /** Origin to the left edge of the first face, > 0. */ leftUm: number;
  /** Origin to the right edge of the first face, > 0. */ rightUm: number;
  /** Broken corner, measured along the edge, ≥ 0. */ cornerUm: number;
};

export type FractureSurfaceSpec = {
  /** Whole number; the same seed is the same piece at every magnification. */ seed: number;
  widthPx: number;
  heightPx: number;
  pixelSizeUm: number;
  /** Centre of the origin in the image, px from the top left corner; pixel 0 spans 0 to 1. */
  origin: { xPx: number; yPx: number };
  /** Origin below the tensile edge, µm; 0 puts it on the edge. */ originDepthUm: number;
  /** null: no origin to be found. */ flaw: SyntheticFlaw | null;
  bystanders?: readonly Bystander[];
  /** Mirror boundary, µm; null where the body is too coarse to show one. */ mirrorRadiusUm: number | null;
  /** Outer radius of the mist over the mirror radius, > 1; 1.35 unless told. */ mistRatio?: number;
  /** Length of the burned-in scale bar, µm; null leaves it out. */ scaleBarUm: number | null;
  body: BodyTexture;
  /** The mate shows the same piece turned over: mirrored left to right, hills for hollows. */ face?: 'first' | 'mate';
  section?: SyntheticSection;
  /** Radius of a round part at its tensile edge, µm; flat unless told. */ tensileCurveRadiusUm?: number;
  /** Height of the compression curl at the far side, µm; needs a section. */ curlUm?: number;
  /** Strength of the Wallner lines, 0 to 1. */ wallner?: number;
  /** Radius of an arrest line, µm. */ arrestRadiusUm?: number;
  /** Where the light comes from, degrees anticlockwise from the right; 118 unless told. */ lightDegrees?: number;
};

export type PointPx = { xPx: number; yPx: number };

/** What is known of the drawn surface: image px, and µm where a length is meant. */
export type SurfaceTruth = {
  pixelSizeUm: number;
  origin: PointPx & { depthUm: number };
  flaw: {
    kind: SyntheticFlawKind;
    halfAxisDepthPx: number;
    halfAxisAlongPx: number;
    halfAxisDepthUm: number;
    halfAxisAlongUm: number;
    /** Points along the drawn outline inside the face, left to right. */ outline: readonly PointPx[];
  } | null;
  mirror: { radiusPx: number; radiusUm: number; mistOuterRadiusPx: number; mistOuterRadiusUm: number } | null;
  /** Radial runs outward beyond the mist, inside face and image; degrees anticlockwise from the right. */
  hackle: readonly { from: PointPx; to: PointPx; directionDegrees: number }[];
  /** Line between fracture surface and tensile surface, left to right. */ tensileEdge: readonly PointPx[];
  /** Left end, upper rim; length is scaleBarUm / pixelSizeUm, its last px shaded by the part it covers. */
  scaleBar: { xPx: number; yPx: number; lengthPx: number; thicknessPx: number; lengthUm: number; label: string } | null;
};

export type FractureSurface = { grey: Uint8Array; widthPx: number; heightPx: number; truth: SurfaceTruth };
