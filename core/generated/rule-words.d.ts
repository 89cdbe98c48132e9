/** Precompiled templates by rule key, each behind a function so that only the ones that are printed are made. */
declare const words: Readonly<Record<string, { readonly title: string; readonly cite: string; readonly says: () => TemplateSpecification; readonly do: () => TemplateSpecification }>>
export default words
