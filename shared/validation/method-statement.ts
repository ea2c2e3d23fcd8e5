/** What the documentation of one public function states about its method. */
export interface MethodStatement {
  topic: string
  name: string
  gives: string
  model: string
  validity: string
  /** As written: source ids with clauses. */
  source: string
  example: string
}

const BLOCK = /\/\*\*((?:(?!\*\/)[\s\S])*?)\*\/\s*export function (\w+)/g

function section(lines: readonly string[], label: string): string {
  const start = lines.findIndex((line) => line.startsWith(`${label}:`))
  if (start < 0) return ''
  const words = [lines[start]?.slice(label.length + 1).trim() ?? '']
  for (const line of lines.slice(start + 1)) {
    if (line === '' || line.startsWith('@') || /^(Model|Validity|Source|Example):/.test(line)) break
    words.push(line)
  }
  return words.join(' ')
}

/**
 * Reads the method statements out of a source file of the calculation core, so that the page for
 * reviewers says what the code says. Functions without a model are tools, not methods.
 */
export function methodStatements(topic: string, sourceText: string): MethodStatement[] {
  return [...sourceText.matchAll(BLOCK)].flatMap(([, comment = '', name = '']) => {
    const lines = comment.split('\n').map((line) => line.replace(/^\s*\*? ?/, '').trim())
    const model = section(lines, 'Model')
    if (model === '') return []
    return [
      {
        topic,
        name,
        gives: lines.find((line) => line !== '') ?? '',
        model,
        validity: section(lines, 'Validity'),
        source: section(lines, 'Source'),
        example: section(lines, 'Example'),
      },
    ]
  })
}
