import { checkProject } from '../../engine/project/checkProject.ts';
import type { Fault } from '../../engine/project/fault.ts';
import type { Model } from '../../engine/project/model.ts';

/** A file that was refused, with everything that is wrong in it. */
export interface RefusedFile {
  readonly fileName: string;
  readonly faults: readonly Fault[];
}

/** The project on screen: its text as it is kept, the model made from it, and the last file that was refused. */
export class OpenProject {
  fileName = $state('');
  text = $state.raw('');
  model = $state.raw<Model | null>(null);
  refused = $state.raw<RefusedFile | null>(null);

  /**
   * Opens a text. A refused one leaves the project on screen as it is.
   *
   * @returns the model, or null where the text was refused
   */
  open(text: string, fileName: string): Model | null {
    const checked = checkProject(text);
    if (!checked.ok) {
      this.refused = { fileName, faults: checked.faults };
      return null;
    }
    this.refused = null;
    this.fileName = fileName;
    this.text = text;
    this.model = checked.model;
    return checked.model;
  }

  /** The refusal has been read. */
  dismissRefusal(): void {
    this.refused = null;
  }

  /** A file could not even be read. */
  refuse(fileName: string, sentence: string): void {
    const fault = { pointer: '', path: 'the file', found: 'nothing that could be read', right: sentence };
    this.refused = { fileName, faults: [fault] };
  }
}
