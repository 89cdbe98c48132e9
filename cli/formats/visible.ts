/** What a terminal or a build service would obey rather than show: controls, and marks that turn the writing round. */
const OBEYED = /[\u0000-\u001f\u007f-\u009f\u200e\u200f\u202a-\u202e\u2028\u2029\u2066-\u2069]/g

/** Signs for control characters, as Unicode has them from here on. */
const CONTROL_PICTURES = 0x2400

function picture(character: string): string {
  const code = character.charCodeAt(0)
  return code < 0x20 ? String.fromCharCode(CONTROL_PICTURES + code) : '\ufffd'
}

/** Text on one line with everything in it to be seen: names and values are foreign, and may hold anything. */
export function visible(text: string): string {
  return text.replace(OBEYED, picture)
}
