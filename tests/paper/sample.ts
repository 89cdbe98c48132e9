import type { Attachment, PaperOptions } from '#core/paper/options.ts'
import { fonts } from './fonts.ts'

const plot = (label: string, seed: number): string => {
  const points = Array.from({ length: 49 }, (_, i) => {
    const value = 228 + 4 * Math.sin((i + seed) / 5) - (i > 18 && i < 24 ? 9 - Math.abs(21 - i) * 2 : 0)
    return `${60 + i * 11},${150 - (value - 205) * 3.4}`
  })
  const hours = Array.from({ length: 9 }, (_, i) => {
    const x = 60 + i * 66
    return `<line class="gridline" x1="${x}" y1="16" x2="${x}" y2="150"/><text class="label" x="${x}" y="166" text-anchor="middle">${i * 5} s</text>`
  })
  return `<svg role="img" aria-label="${label}" viewBox="0 0 620 176">
<rect class="water" x="60" y="16" width="528" height="134" opacity="0.5"/>
${hours.join('\n')}
<line class="limit" x1="60" y1="${150 - (207 - 205) * 3.4}" x2="588" y2="${150 - (207 - 205) * 3.4}"/>
<text class="label" x="54" y="${153 - (230 - 205) * 3.4}" text-anchor="end">230 V</text>
<text class="label" x="54" y="${153 - (207 - 205) * 3.4}" text-anchor="end">207 V</text>
<polyline class="island" points="${points.join(' ')}"/>
<line class="axis" x1="60" y1="150" x2="588" y2="150"/>
<g transform="translate(258 30) rotate(-4)" stroke="#16242e" fill="none"><path d="m0 0c8 6 12 14 10 26l-4-6m4 6l5-5" stroke-width=".8"/></g>
<text class="value" x="256" y="28" text-anchor="end">cold store starts: 221 V ≥ 207 V</text>
</svg>`
}

const arcs = `<svg role="img" viewBox="0 0 300 80"><title>Arcs, curves, and every basic shape</title>
<desc>One row of shapes</desc>
<path d="M10 40A20 20 0 0 1 50 40A20 20 0 1 1 10 40Z" fill="#dfeaf1" stroke="#34617f"/>
<path d="M60 60Q80 0 100 60" class="ink"/><path d="M110 60h10v-30H130V60" class="ink" stroke-linejoin="round"/>
<circle cx="160" cy="40" r="16" fill="none" stroke="currentColor" stroke-dasharray="3 2"/>
<ellipse cx="200" cy="40" rx="18" ry="9" fill="#b4690e" fill-opacity="0.4"/>
<rect x="226" y="24" width="28" height="32" rx="6" fill="none" stroke="#16242e" stroke-opacity=".6"/>
<polygon points="262,56 276,24 290,56" fill="none" stroke="#000" stroke-width="1.5px"/>
<g transform="scale(0.5) translate(20,140)"><text x="0" y="0" font-weight="bold" font-size="14">Ω ✓</text></g>
</svg>`

/** A bar that shows a reading against its limit, small enough for a cell. */
const bar = (part: number): string =>
  `<figure><svg role="img" aria-label="${Math.round(part * 100)} % of the limit" viewBox="0 0 100 8" width="100%"><line x1="0" y1="4" x2="100" y2="4" stroke="#b4c3cd" stroke-width=".7"/><line x1="88" y1="0" x2="88" y2="8" stroke="#9b2c1f" stroke-width="1.2"/><circle cx="${part * 88}" cy="4" r="2.6" fill="#16242e"/></svg></figure>`

const VERDICTS = [
  ['meets', 'meets'],
  ['meets-inside', 'meets, inside the uncertainty'],
  ['fails-inside', 'fails, inside the uncertainty'],
  ['fails', 'fails'],
  ['not-shown', 'not shown'],
  ['limited', 'limited'],
  ['not-applicable', 'not applicable'],
] as const

const badge = (index: number): string => {
  const [name, word] = VERDICTS[index % VERDICTS.length] ?? VERDICTS[0]
  return `<span class="verdict-${name}">${word}</span>`
}

const circuits = Array.from({ length: 46 }, (_, i) => {
  const loop = 0.35 + ((i * 37) % 90) / 100
  return `<tr${i === 11 ? ' class="row-fails"' : ''}><th scope="row">K${i + 1}</th><td>${i % 3 ? 'Sockets, workshop and yard' : 'Cold store'}</td><td>B${[10, 16, 20, 32][i % 4]}</td><td class="num">${loop.toFixed(2)}</td><td class="num">2.30</td><td>${bar(Math.min(1.1, loop / 1.2))}</td><td>${badge(i === 11 ? 3 : i % 9 === 4 ? 1 : 0)}</td></tr>`
})

const groups = ['Grid', 'Island', 'Changeover to the island', 'Changeover to the grid'].map(
  (state, g) =>
    `<tbody><tr><th scope="rowgroup" colspan="4">${state}</th></tr>${Array.from(
      { length: 9 },
      (_, i) =>
        `<tr${state === 'Island' && i === 2 ? ' class="row-island"' : ''}><th scope="row">${['Voltage L1', 'Voltage L2', 'Voltage L3', 'Frequency', 'Rotation', 'Neutral to earth', 'Link resistance', 'Trip at rated current', 'Trip at five times'][i]}</th><td class="num">${230 + ((i * 7 + g) % 5)} V</td><td class="num">207 V to 253 V</td><td>${badge(i === 5 ? 4 : 0)}</td></tr>`,
    ).join('')}</tbody>`,
)

const PROSE =
  'The building was cut from the public grid upstream of the changeover, not at the inverter. All four poles opened, the neutral-earth link closed, and the backed-up circuits came back after 1.8 s. '

/** Everything that the HTML subset and its classes can do, on several pages. */
export const sampleHtml = `
<div class="title-block"><p class="small-label">Initial verification · FM-2026-031</p><h1>Alder Mill Bakery</h1>
<p class="lead">Test report for an installation with photovoltaics, a battery and automatic changeover</p>
<p class="muted">Mill Lane 4, Fennmark · inspected 12 to 13 October 2026</p></div>
<div class="grid-3">
<div class="box"><p class="small-label">Outcome</p><p class="figure">47 meet</p><p>${badge(3)} one circuit; ${badge(4)} four readings</p></div>
<div class="box"><p class="small-label">In the island</p><p class="figure">6 h 20 min</p><p class="muted">from 3.84 kWh held back</p></div>
<div class="box-island"><p class="small-label">What lives on</p><p><span class="island">K1 Cold store</span>, K2 Bakery sockets</p></div></div>
<section id="summary"><h2>1 Summary</h2>
<p>${PROSE}<strong>Strong words</strong>, <em>leaning words</em>, H<sub>2</sub>O, 2.5 mm<sup>2</sup>, <small>small print</small>, and signs: &amp; &lt; &gt; &quot; Ω µ ² → ≤ ≥ Δ − ± ✓ ✗ ☐ ☑.</p>
<p>${PROSE.repeat(2)}</p>
<div class="box-caution"><h3>1.1 Caution</h3><p>Dangerous voltage is present on the backed-up side while the grid is off. ${PROSE}</p></div>
<div class="box-note"><p>A reading on the grid never stands in for the island.</p></div>
<h3>1.2 Words for verdicts</h3>
<ul>${VERDICTS.map(([name, word]) => `<li><span class="verdict-${name}">${word}</span></li>`).join('')}</ul>
<ol><li>Open the supply upstream of the changeover.<ul><li>Not at the inverter</li><li>With all loads on</li></ul></li><li>Wait until the light returns.</li></ol>
<h4>Particulars</h4>
<dl><dt>Earthing system</dt><dd>TN-C-S</dd><dt>Main protection</dt><dd>gG 63 A</dd><dt>External loop impedance</dt><dd>0.24 Ω, measured by the installer with instrument T1 at the origin of the installation, before the changeover was fitted and again after it</dd><dt>Separation</dt><dd>all poles</dd></dl>
</section>
<section class="page-break"><h2>2 Circuits</h2><p>Loop impedance against the limit U<sub>0</sub> · c<sub>min</sub> / I<sub>a</sub>.</p>
<table id="loops"><caption>Table 1. Loop impedance of each circuit</caption><colgroup><col width="7%"><col><col width="8%"><col class="num" width="9%"><col class="num" width="9%"><col width="20%"><col width="16%"></colgroup>
<thead><tr><th scope="col">Circuit</th><th scope="col">Serves</th><th scope="col">Device</th><th scope="colgroup" class="num" colspan="2">Loop impedance, Ω</th><th scope="col">Against the limit</th><th scope="col">Verdict</th></tr>
<tr><th scope="col"></th><th scope="col"></th><th scope="col"></th><th scope="col">read</th><th scope="col">limit</th><th scope="col"></th><th scope="col"></th></tr></thead>
<tbody>${circuits.join('')}</tbody></table></section>
<section><h2>3 States</h2><table class="zebra"><caption>Table 2. Readings by state</caption><thead><tr><th scope="col">Reading</th><th scope="col" class="num">Value</th><th scope="col" class="num">Allowed</th><th scope="col">Verdict</th></tr></thead>${groups.join('')}</table>
<h3>3.1 Voltage while the cold store starts</h3>
<figure>${plot('Voltage in the island over 40 s: it dips to 221 V and stays above 207 V', 0)}<figcaption>Figure 1. Voltage of L1 in the island. The limit of 207 V is the lower end of 230 V ± 10 %.</figcaption></figure>
<figure>${arcs}</figure>
<div class="columns-2"><p>${PROSE.repeat(3)}</p><p>${PROSE.repeat(2)}</p></div>
<div class="columns-2"><div><h3>3.2 Photos</h3><figure><img src="board.jpg" alt="The main board with its notice" width="60%"><figcaption>Photo 1. Main board</figcaption></figure></div><div><p>Right column. ${PROSE}</p></div></div>
</section>
<section><h2>4 What to do</h2>${Array.from({ length: 9 }, (_, i) => `<h3>4.${i + 1} Step</h3><p>${PROSE.repeat(3)}</p>`).join('')}</section>`

/** The smallest JPEG that a reader accepts: 8 by 8 pixels of one grey. */
export const greyJpeg = new Uint8Array(
  Buffer.from(
    '/9j/4AAQSkZJRgABAQEAYABgAAD/2wBDAAgGBgcGBQgHBwcJCQgKDBQNDAsLDBkSEw8UHRofHh0aHBwgJC4nICIsIxwcKDcpLDAxNDQ0Hyc5PTgyPC4zNDL/wAALCAAIAAgBAREA/8QAHwAAAQUBAQEBAQEAAAAAAAAAAAECAwQFBgcICQoL/8QAtRAAAgEDAwIEAwUFBAQAAAF9AQIDAAQRBRIhMUEGE1FhByJxFDKBkaEII0KxwRVS0fAkM2JyggkKFhcYGRolJicoKSo0NTY3ODk6Q0RFRkdISUpTVFVWV1hZWmNkZWZnaGlqc3R1dnd4eXqDhIWGh4iJipKTlJWWl5iZmqKjpKWmp6ipqrKztLW2t7i5usLDxMXGx8jJytLT1NXW19jZ2uHi4+Tl5ufo6erx8vP09fb3+Pn6/9oACAEBAAA/APn+v//Z',
    'base64',
  ),
)

export const attachments: readonly Attachment[] = [
  {
    name: 'install.yaml',
    type: 'application/yaml',
    bytes: new TextEncoder().encode('skerry: 1\nsite: { name: Alder Mill Bakery } # Ω\n'),
    relationship: 'Source',
    description: 'The installation as entered',
    created: '2026-10-13T16:00:00Z',
  },
  {
    name: 'facts.json',
    type: 'application/json',
    bytes: Uint8Array.from({ length: 4000 }, (_, i) => (i * 31) % 256),
    relationship: 'Data',
    description: 'Every computed quantity',
    created: '2026-10-13T16:00:00Z',
  },
]

export const sampleOptions: PaperOptions = {
  fonts,
  title: 'Alder Mill Bakery & Sons: report <FM-2026-031>',
  author: 'Fenn "Electric" Ltd',
  subject: 'Initial verification, 230 V',
  language: 'en',
  created: '2026-10-13T16:05:00Z',
  header: { left: 'Alder Mill Bakery · FM-2026-031', right: 'Rule book iec 0.1.0' },
  footer: ({ page }) => ({ left: page === 1 ? 'Set by Skerry' : 'Alder Mill Bakery', right: 'page {page} of {pages}' }),
  attachments,
  pictures: { 'board.jpg': greyJpeg },
  watermark: 'DRAFT',
}
