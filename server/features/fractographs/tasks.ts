import { z } from 'zod';
import type { TaskTable } from '../../jobs/run-jobs.ts';
import { cutTiles } from './service/cut-tiles.ts';
import { dropRefused } from './service/drop-refused.ts';

const OfFractograph = z.object({ fractographId: z.uuid() });
const OfBytes = z.object({ sha256: z.string() });

export const fractographTasks: TaskTable = {
  'cut-tiles': (context, payload) => cutTiles(context, OfFractograph.parse(payload).fractographId),
  'drop-refused': (context, payload) => dropRefused(context, OfBytes.parse(payload).sha256),
};
