/** The job queues; each one's payload holds ids only, its worker loads and checks again. */
export const QUEUES = {
  checkRun: 'check-run',
} as const;

export type QueueName = (typeof QUEUES)[keyof typeof QUEUES];
