/** The version of the file that this program writes and reads. */
export const CURRENT_VERSION = 1;

/** Turns a project of version `from` into one of version `from` + 1; never throws, whatever the project holds. */
export interface UpgradeStep {
  readonly from: number;
  readonly upgrade: (project: Readonly<Record<string, unknown>>) => Record<string, unknown>;
}

/** Every step there has been, oldest first. Version 1 is the first there was. */
export const UPGRADE_STEPS: readonly UpgradeStep[] = [];

/**
 * A project brought to the current version, one version at a time.
 *
 * @param version version that the project states, a whole number
 * @param steps the steps known; those of this program unless given
 * @param current the version to reach
 * @returns the project, or a null when it is newer than `current` or older than the oldest step
 */
export function upgradeProject(
  project: Readonly<Record<string, unknown>>,
  version: number,
  steps: readonly UpgradeStep[] = UPGRADE_STEPS,
  current: number = CURRENT_VERSION,
): Readonly<Record<string, unknown>> | null {
  let upgraded = project;
  for (let reached = version; reached !== current; reached += 1) {
    const step = steps.find(({ from }) => from === reached);
    if (step === undefined || reached > current) return null;
    upgraded = { ...step.upgrade(upgraded), version: reached + 1 };
  }
  return upgraded;
}
