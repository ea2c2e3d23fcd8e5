/** Stored with every release. Raise it whenever a formula, a rule or a default changes a number. */
export const ENGINE_VERSION = '1.0.0'
