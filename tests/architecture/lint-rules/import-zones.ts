/** Reports an import that the table in ../import-rules.ts does not allow, at the line that makes it. */
import { relative } from 'node:path'
import { AST_NODE_TYPES, ESLintUtils, type TSESTree } from '@typescript-eslint/utils'
import { allZones, importProblem, PROJECT_ROOT } from '../import-rules'

const zones = allZones()

export const importZones = ESLintUtils.RuleCreator.withoutDocs({
  meta: { type: 'problem', schema: [], messages: { forbidden: '{{problem}}' } },
  defaultOptions: [],
  create(context) {
    const path = relative(PROJECT_ROOT, context.filename)
    function check(source: TSESTree.Node | null | undefined) {
      if (source?.type !== AST_NODE_TYPES.Literal || typeof source.value !== 'string') return
      const problem = importProblem(path, source.value, zones)
      if (problem) context.report({ node: source, messageId: 'forbidden', data: { problem } })
    }
    return {
      ImportDeclaration: (node) => check(node.source),
      ExportNamedDeclaration: (node) => check(node.source),
      ExportAllDeclaration: (node) => check(node.source),
      ImportExpression: (node) => check(node.source),
      TSImportType: (node) => check(node.source),
    }
  },
})
