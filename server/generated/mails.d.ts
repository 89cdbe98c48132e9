/** Precompiled pages and their partials by name, each behind a function so that only those in use are made. */
declare const templates: Readonly<Record<'pages' | 'partials', Readonly<Record<string, () => TemplateSpecification>>>>
export default templates
