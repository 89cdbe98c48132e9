/** Precompiled templates by name, each behind a function so that only those in use are made. */
declare const templates: Readonly<Record<string, () => TemplateSpecification>>
export default templates
