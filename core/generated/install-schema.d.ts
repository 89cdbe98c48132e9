/** The bundled schema as JSON text: it is parsed only where a file has errors to explain. */
declare const text: () => string
export default text
