import type { Route } from './http/route.ts';
import { caseRoutes } from './features/cases/routes.ts';
import { estimateRoutes } from './features/estimates/routes.ts';
import { closureRoutes } from './features/closure/routes.ts';
import { evidenceRoutes } from './features/evidence/routes.ts';
import { findingsRoutes } from './features/findings/routes.ts';
import { fractographRoutes } from './features/fractographs/routes.ts';
import { calibrationRoutes } from './features/laboratory/routes/calibrations.ts';
import { laboratoryRoutes } from './features/laboratory/routes.ts';
import { markRoutes } from './features/marks/routes.ts';
import { materialRoutes } from './features/materials/routes.ts';
import { peopleRoutes } from './features/people/routes.ts';

/** Every route of the server below /api, in one table: what is mounted is what the rights test walks. */
export const allRoutes: readonly Route[] = [
  ...peopleRoutes,
  ...laboratoryRoutes,
  ...materialRoutes,
  ...caseRoutes,
  ...evidenceRoutes,
  ...calibrationRoutes,
  ...fractographRoutes,
  ...markRoutes,
  ...estimateRoutes,
  ...findingsRoutes,
  ...closureRoutes,
];
