import { type LayoutFileProblem, parseLayoutFile } from '@shared/layout/layout-file'

/** The server takes no more; a real layout is a hundredth of it. */
const MAX_FILE_BYTES = 1_000_000

export type ReadLayoutFile =
  | { ok: true; fileName: string; layoutName: string; content: unknown }
  | { ok: false; fileName: string; problems: LayoutFileProblem[] }

/** Everything that can be said about a file before it is sent. */
export async function readLayoutFile(file: File): Promise<ReadLayoutFile> {
  const fileName = file.name
  const refuse = (message: string): ReadLayoutFile => ({
    ok: false,
    fileName,
    problems: [{ path: '', message }],
  })
  if (file.size > MAX_FILE_BYTES) return refuse('The file is larger than 1 MB; layout files are much smaller')

  let content: unknown
  try {
    content = JSON.parse(await file.text())
  } catch {
    return refuse('This is not a JSON file, or it was cut off')
  }
  const parsed = parseLayoutFile(content)
  return parsed.ok
    ? { ok: true, fileName, layoutName: parsed.document.name, content }
    : { ok: false, fileName, problems: parsed.problems }
}
