/** File and folder names are kebab-case, with dots only for roles (`edits.repository.ts`). */
import { relative } from 'node:path'
import { ESLintUtils } from '@typescript-eslint/utils'
import { PROJECT_ROOT } from '../import-rules'

const KEBAB = /^\.?[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9]+(-[a-z0-9]+)*)*$/
/** Migrations sort by date. */
const MIGRATION = /^migrations\/\d{8}T\d{4}_[a-z0-9]+(_[a-z0-9]+)*\.ts$/

export const kebabCaseFiles = ESLintUtils.RuleCreator.withoutDocs({
  meta: {
    type: 'problem',
    schema: [],
    messages: { name: '{{path}} is not in kebab-case.' },
  },
  defaultOptions: [],
  create(context) {
    const path = relative(PROJECT_ROOT, context.filename)
    const isFine = path.startsWith('migrations/')
      ? MIGRATION.test(path)
      : path.split('/').every((part) => KEBAB.test(part))
    return {
      Program(node) {
        if (!isFine) context.report({ node, messageId: 'name', data: { path } })
      },
    }
  },
})
