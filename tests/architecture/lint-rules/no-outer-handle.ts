/**
 * Inside a transaction callback only the transaction may be used. One SQLite connection has one
 * mutex: the outer handle would join the transaction unseen or wait for it for ever.
 */
import { AST_NODE_TYPES, ESLintUtils, type TSESLint, type TSESTree } from '@typescript-eslint/utils'

/** Names that database handles have in this project. */
const HANDLE_NAMES = new Set(['db', 'kysely', 'sqlite', 'database'])
const TRANSACTION_CALL = /^(transaction|\w+Transaction|immediate)$/

function calleeName(callee: TSESTree.Expression): string {
  if (callee.type === AST_NODE_TYPES.Identifier) return callee.name
  if (callee.type === AST_NODE_TYPES.MemberExpression && callee.property.type === AST_NODE_TYPES.Identifier)
    return callee.property.name
  return ''
}

/** `db.transaction().execute(callback)` as well as `writeTransaction(callback)`. */
function isTransactionCall(node: TSESTree.CallExpression): boolean {
  if (TRANSACTION_CALL.test(calleeName(node.callee))) return true
  return (
    node.callee.type === AST_NODE_TYPES.MemberExpression &&
    calleeName(node.callee) === 'execute' &&
    node.callee.object.type === AST_NODE_TYPES.CallExpression &&
    isTransactionCall(node.callee.object)
  )
}

function isInside(variable: TSESLint.Scope.Variable | null, callback: TSESTree.Node): boolean {
  const definition = variable?.defs[0]?.name
  return (
    definition !== undefined &&
    definition.range[0] >= callback.range[0] &&
    definition.range[1] <= callback.range[1]
  )
}

export const noOuterHandle = ESLintUtils.RuleCreator.withoutDocs({
  meta: {
    type: 'problem',
    schema: [],
    messages: {
      outer: '`{{name}}` is the outer database handle; use the transaction given to this callback.',
    },
  },
  defaultOptions: [],
  create(context) {
    const callbacks: TSESTree.Node[] = []
    const enter = (node: TSESTree.ArrowFunctionExpression | TSESTree.FunctionExpression) => {
      if (node.parent.type === AST_NODE_TYPES.CallExpression && isTransactionCall(node.parent))
        callbacks.push(node)
    }
    const leave = (node: TSESTree.Node) => {
      if (callbacks.at(-1) === node) callbacks.pop()
    }
    return {
      ArrowFunctionExpression: enter,
      FunctionExpression: enter,
      'ArrowFunctionExpression:exit': leave,
      'FunctionExpression:exit': leave,
      Identifier(node) {
        const callback = callbacks.at(-1)
        if (!callback || !HANDLE_NAMES.has(node.name)) return
        const isProperty =
          node.parent.type === AST_NODE_TYPES.MemberExpression && node.parent.property === node
        const isKey =
          node.parent.type === AST_NODE_TYPES.Property && node.parent.key === node && !node.parent.shorthand
        if (isProperty || isKey) return
        const reference = context.sourceCode
          .getScope(node)
          .references.find((each) => each.identifier === node)
        if (reference && !isInside(reference.resolved, callback)) {
          context.report({ node, messageId: 'outer', data: { name: node.name } })
        }
      },
    }
  },
})
