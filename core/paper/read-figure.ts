import { attribute, content, type Element, elements, problem } from './markup.ts'
import { readRuns } from './read-inline.ts'
import { common, type Reading } from './reading.ts'
import { readSvg } from './svg-read.ts'
import type { Figure } from './tree.ts'

const readPhoto = (element: Element, reading: Reading) => {
  const name = attribute(element, 'src') ?? ''
  if (!reading.pictures.has(name)) {
    const known = [...reading.pictures].join(', ') || 'none'
    throw problem(
      'unknown-picture',
      element,
      `<img> shows “${name}”, which was not handed over. Pictures at hand: ${known}.`,
    )
  }
  const alternative = attribute(element, 'alt')?.trim()
  if (!alternative)
    throw problem('missing-alternative', element, '<img> has no alt text. Say in words what the picture shows.')
  return { picture: { kind: 'photo', name } as const, alternative }
}

const titleOf = (element: Element): string | undefined => {
  const title = elements(element).find(({ tagName }) => tagName === 'title')
  const text = title && readRuns(content(title)).map((run) => (run.kind === 'text' ? run.text : ' '))
  return text?.join('').trim()
}

const readDrawing = (element: Element, reading: Reading) => {
  const alternative = attribute(element, 'aria-label')?.trim() || titleOf(element)
  if (attribute(element, 'role') !== 'img' || !alternative) {
    const sentence = '<svg> needs role="img" and an aria-label or a <title> that says in words what it shows.'
    throw problem('missing-alternative', element, sentence)
  }
  return { picture: { kind: 'svg', svg: readSvg(element, reading.svgStyles) } as const, alternative }
}

/**
 * A figure: one drawing or photo with its words, and a caption.
 *
 * @throws PaperError misplaced-tag (not exactly one picture), missing-alternative, unknown-picture, and what `readSvg` throws
 */
export const readFigure = (element: Element, reading: Reading): Figure => {
  const children = elements(element)
  const [picture, ...others] = children.filter(({ tagName }) => tagName !== 'figcaption')
  if (!picture || others.length > 0) {
    throw problem('misplaced-tag', element, '<figure> holds exactly one <svg> or <img>, and its <figcaption>.')
  }
  const captions = children.filter(({ tagName }) => tagName === 'figcaption')
  const shown = picture.tagName === 'img' ? readPhoto(picture, reading) : readDrawing(picture, reading)
  return {
    ...common(element),
    kind: 'figure',
    ...shown,
    width: attribute(picture, 'width'),
    caption: captions.flatMap((caption) => readRuns(content(caption))),
  }
}
