import type { TypedInput } from './demo-case.ts';

type Bar = {
  loadN: number;
  /** Standard uncertainty of the load, percent; 1.73 on the demo's test frame. */
  loadPercent?: number;
  widthMm: number;
  depthMm: number;
  spansMm?: readonly [outer: number, inner: number];
  /** Whether section and spans carry an uncertainty of their own, or all of it lies in the load. */
  allInLoad?: true;
};

/** The inputs of a four-point bar as an analyst types them: section to 0.01 mm, spans to 0.1 mm. */
export function barInputs(bar: Bar): Record<string, TypedInput> {
  const [outer, inner] = bar.spansMm ?? [40, 20];
  const section = bar.allInLoad ? '0 mm' : '0.01 mm';
  const spans = bar.allInLoad ? '0 mm' : '0.1 mm';
  return {
    load: { text: `${bar.loadN} N`, standardUncertainty: `${bar.loadPercent ?? 1.73} %` },
    outerSpan: { text: `${outer} mm`, standardUncertainty: spans },
    innerSpan: { text: `${inner} mm`, standardUncertainty: spans },
    width: { text: `${bar.widthMm.toFixed(2)} mm`, standardUncertainty: section },
    depth: { text: `${bar.depthMm.toFixed(2)} mm`, standardUncertainty: section },
  };
}

/** The same bar with its origin a given depth below the tensile face, read to 0.0125 mm, inside the inner span. */
export function barInputsAtDepth(bar: Bar, originDepthMm: number): Record<string, TypedInput> {
  return {
    ...barInputs(bar),
    x: { text: '0 mm', standardUncertainty: '0.5 mm' },
    y: { text: `${originDepthMm} mm`, standardUncertainty: '0.0125 mm' },
  };
}
