import { fractographTasks } from './features/fractographs/tasks.ts';
import { peopleTasks } from './features/people/tasks.ts';
import type { TaskTable } from './jobs/run-jobs.ts';
import { mailTasks } from './mail/tasks.ts';
import type { Settings } from './settings.ts';

/** The settings, with the address under which this server is reached: the start of every link in a mail. */
export type ServingSettings = Settings & { readonly address: string };

/** Every kind of job the server answers, by the name it is put down under. */
export function allTasks(settings: ServingSettings): TaskTable {
  return { ...mailTasks(settings), ...peopleTasks, ...fractographTasks };
}
