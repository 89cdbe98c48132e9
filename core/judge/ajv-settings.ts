/** How a rule's schemas are compiled, at build time and for a book of one's own alike. */
export const AJV_RULE_SETTINGS = {
  $data: true,
  strict: true,
  // A sheet's fields have the types that their plan gives them, so a schema need not repeat them.
  strictTypes: false,
  strictRequired: false,
  strictNumbers: false,
  ownProperties: true,
  messages: false,
} as const
