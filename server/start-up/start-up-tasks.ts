import type { Dependencies } from '../dependencies';
import { resumeUploads } from '../services/uploads/resume-uploads';

/** Something to put right before serving: what a crash or a stop left half done. */
export interface StartUpTask {
  /** Shown while it runs, as in "Sweeping unfinished uploads". */
  readonly name: string;
  readonly run: (dependencies: Dependencies) => Promise<void>;
}

/** In this order, before the first request. A new task is a line. */
export const START_UP_TASKS: readonly StartUpTask[] = [
  { name: 'Putting unfinished uploads right', run: resumeUploads },
];

/** Runs every task, one after the other. */
export async function runStartUpTasks(dependencies: Dependencies): Promise<void> {
  for (const task of START_UP_TASKS) await task.run(dependencies);
}
