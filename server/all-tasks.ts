import type { TaskTable } from './jobs/run-jobs.ts';

/** Every kind of job the server answers, by the name it is put down under. */
export const allTasks: TaskTable = {};
