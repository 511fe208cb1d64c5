import type { Model } from '../engine/project/model.ts';
import { chanceBandText, chanceText } from '../web/words/chanceText.ts';
import { numberText } from '../web/words/numberText.ts';
import { REALISATIONS_IN_REPLICATE } from '../engine/project/replicateSize.ts';
import type { StudyProgress } from './protocol.ts';

export interface ProgressLine {
  /** Whether it shows the chance of passing the first limit with its running band. */
  readonly wantsChances: boolean;
  readonly show: (progress: StudyProgress) => void;
  readonly clear: () => void;
}

/** One line on a terminal that says how far a study has come; silent where there is no terminal. */
export function progressLine(model: Model, stream: NodeJS.WriteStream | null): ProgressLine {
  const terminal = stream !== null && stream.isTTY ? stream : null;
  const limit = model.limits[0];
  let chance = '';
  return {
    wantsChances: terminal !== null && limit !== undefined,
    show({ replicatesDone, replicates, chances }) {
      if (terminal === null) return;
      const of = replicatesDone * REALISATIONS_IN_REPLICATE;
      if (chances !== null && chances.length > 0) {
        const { value, low, high } = chances[0];
        const known = { value, low, high, above: Math.round(value * of), of };
        const band = chanceBandText(known);
        chance = `  ${limit.name}: ${chanceText(known)}${band === '' ? '' : ` (${band})`}`;
      }
      const done = `${numberText(of)} of ${numberText(replicates * REALISATIONS_IN_REPLICATE)} realisations`;
      terminal.write(`\r\u001b[2K${`${done}${chance}`.slice(0, Math.max(20, (terminal.columns || 80) - 1))}`);
    },
    clear() {
      terminal?.write('\r\u001b[2K');
    },
  };
}
