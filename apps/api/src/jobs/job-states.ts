export const JOB_STATES = ['queued', 'running', 'done', 'cancelled', 'failed'] as const;
export type JobState = (typeof JOB_STATES)[number];
export const UNFINISHED: readonly JobState[] = ['queued', 'running'];
