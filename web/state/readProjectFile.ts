/** A text that was read, or what would be right. */
export type ReadFile =
  { readonly ok: true; readonly text: string } | { readonly ok: false; readonly right: string };

/** Reads a project file as text; one above 20 MB is not even read. */
export async function readProjectFile(file: File): Promise<ReadFile> {
  if (file.size > MOST_BYTES) return { ok: false, right: 'a project file of at most 20 MB' };
  try {
    return { ok: true, text: await file.text() };
  } catch {
    return { ok: false, right: 'a file that the browser is allowed to read' };
  }
}

const MOST_BYTES = 20_000_000;
