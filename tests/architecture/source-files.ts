/** The project's own files as the architecture tests see them: paths relative to the root, with text. */
import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import ts from 'typescript'
import { PROJECT_ROOT, resolveSpecifier, withoutExtension } from './import-rules'

const NOT_OURS = new Set(['node_modules', 'dist', 'data', 'test-results', 'playwright-report', '.git'])

export interface SourceFile {
  path: string
  text: string
}

function walk(folder: string): string[] {
  return readdirSync(join(PROJECT_ROOT, folder), { withFileTypes: true }).flatMap((entry) => {
    const path = folder === '' ? entry.name : `${folder}/${entry.name}`
    // `data` at the top holds the database; folders of that name deeper down hold tables of ours.
    if (entry.isDirectory()) return folder === '' && NOT_OURS.has(entry.name) ? [] : walk(path)
    return [path]
  })
}

export function projectFiles(): string[] {
  return walk('').sort()
}

export function sourceFiles(folders: string[]): SourceFile[] {
  return projectFiles()
    .filter((path) => /\.tsx?$/.test(path) && folders.some((folder) => path.startsWith(`${folder}/`)))
    .map((path) => ({ path, text: readFileSync(join(PROJECT_ROOT, path), 'utf8') }))
}

export function importsOf(file: SourceFile): string[] {
  return ts.preProcessFile(file.text, true, true).importedFiles.map((imported) => imported.fileName)
}

/** Which files of the list each file imports. */
export function importGraph(files: SourceFile[]): Map<string, string[]> {
  const byBarePath = new Map(files.map((file) => [withoutExtension(file.path), file.path]))
  return new Map(
    files.map((file) => {
      const targets = importsOf(file).flatMap((specifier) => {
        const resolved = resolveSpecifier(file.path, specifier)
        const target =
          resolved.kind === 'project' ? byBarePath.get(withoutExtension(resolved.path)) : undefined
        return target === undefined ? [] : [target]
      })
      return [file.path, targets]
    }),
  )
}

/** Each cycle once, as the path that leads back to its start. */
export function findCycles(graph: Map<string, string[]>): string[][] {
  const finished = new Set<string>()
  const cycles: string[][] = []
  const visit = (path: string, trail: string[]) => {
    const start = trail.indexOf(path)
    if (start >= 0) {
      cycles.push([...trail.slice(start), path])
      return
    }
    if (finished.has(path)) return
    for (const target of graph.get(path) ?? []) visit(target, [...trail, path])
    finished.add(path)
  }
  for (const path of graph.keys()) visit(path, [])
  return cycles
}

export interface ExportedName {
  name: string
  kind: 'function' | 'type' | 'value'
  path: string
}

export function exportedNames(file: SourceFile): ExportedName[] {
  const tree = ts.createSourceFile(file.path, file.text, ts.ScriptTarget.Latest, false, ts.ScriptKind.TSX)
  const isExported = (node: ts.Statement) =>
    ts.canHaveModifiers(node) &&
    (ts.getModifiers(node)?.some((modifier) => modifier.kind === ts.SyntaxKind.ExportKeyword) ?? false)
  return tree.statements.filter(isExported).flatMap((node): ExportedName[] => {
    if (ts.isVariableStatement(node)) {
      return node.declarationList.declarations.flatMap(({ name }) =>
        ts.isIdentifier(name) ? [{ name: name.text, kind: 'value', path: file.path }] : [],
      )
    }
    if (ts.isFunctionDeclaration(node) && node.name) {
      return [{ name: node.name.text, kind: 'function', path: file.path }]
    }
    if (ts.isClassDeclaration(node) && node.name) {
      return [{ name: node.name.text, kind: 'value', path: file.path }]
    }
    if (ts.isInterfaceDeclaration(node) || ts.isTypeAliasDeclaration(node)) {
      return [{ name: node.name.text, kind: 'type', path: file.path }]
    }
    return []
  })
}

/** A file that does nothing but pass on what other files of ours export. Choosing from a package is work. */
export function isBarrel(file: SourceFile): boolean {
  const tree = ts.createSourceFile(file.path, file.text, ts.ScriptTarget.Latest, false, ts.ScriptKind.TSX)
  const passesOn = (node: ts.ExportDeclaration) =>
    !node.moduleSpecifier ||
    (ts.isStringLiteral(node.moduleSpecifier) &&
      resolveSpecifier(file.path, node.moduleSpecifier.text).kind === 'project')
  return (
    tree.statements.some((node) => ts.isExportDeclaration(node) && passesOn(node)) &&
    tree.statements.every((node) => ts.isImportDeclaration(node) || ts.isExportDeclaration(node))
  )
}
