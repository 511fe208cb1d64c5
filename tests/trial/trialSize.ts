/** Size of a long trial: all of it under `npm run trial`, a fixed twentieth under `npm test`. */
export function trialSize(full: number): number {
  return process.env.SLOW_GROUND_TRIAL === 'full' ? full : Math.ceil(full / 20);
}
