/** What the metadata packet says about the document. */
export interface About {
  readonly title: string
  readonly author: string
  readonly subject: string | undefined
  readonly language: string
  readonly created: Date
  readonly producer: string
  readonly part: 1 | 3
  readonly conformance: 'A' | 'B'
}

/**
 * Text as it may stand in XML content or in an attribute.
 *
 * @param text any text; characters that XML 1.0 forbids (control characters) are dropped
 */
export const escapeXml = (text: string): string =>
  text
    .replace(/[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]/g, '')
    .replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`)

/** PDF/A wants a schema of its own for each property that it does not know; `pdfuaid:part` is one (ISO 19005-3, 6.6.2.3). */
const EXTENSION = `<rdf:Description rdf:about="" xmlns:pdfaExtension="http://www.aiim.org/pdfa/ns/extension/" xmlns:pdfaSchema="http://www.aiim.org/pdfa/ns/schema#" xmlns:pdfaProperty="http://www.aiim.org/pdfa/ns/property#">
<pdfaExtension:schemas><rdf:Bag><rdf:li rdf:parseType="Resource">
<pdfaSchema:schema>PDF/UA identification schema</pdfaSchema:schema>
<pdfaSchema:namespaceURI>http://www.aiim.org/pdfua/ns/id/</pdfaSchema:namespaceURI>
<pdfaSchema:prefix>pdfuaid</pdfaSchema:prefix>
<pdfaSchema:property><rdf:Seq><rdf:li rdf:parseType="Resource">
<pdfaProperty:name>part</pdfaProperty:name>
<pdfaProperty:valueType>Integer</pdfaProperty:valueType>
<pdfaProperty:category>internal</pdfaProperty:category>
<pdfaProperty:description>Part of ISO 14289 that the document follows</pdfaProperty:description>
</rdf:li></rdf:Seq></pdfaSchema:property>
</rdf:li></rdf:Bag></pdfaExtension:schemas>
</rdf:Description>
<rdf:Description rdf:about="" xmlns:pdfuaid="http://www.aiim.org/pdfua/ns/id/"><pdfuaid:part>1</pdfuaid:part></rdf:Description>
`

const alternative = (name: string, text: string): string =>
  `<dc:${name}><rdf:Alt><rdf:li xml:lang="x-default">${escapeXml(text)}</rdf:li></rdf:Alt></dc:${name}>\n`

/**
 * The XMP packet of the document: who, what, when, and which parts of PDF/A and PDF/UA it follows.
 *
 * @param about the same values that stand in the document information dictionary (ISO 19005-1, 6.7.3 wants them equal)
 * @returns the packet as text, to be stored as UTF-8
 * @source XMP Specification Part 1 (2012); ISO 19005-3:2012, 6.6; ISO 14289-1:2014, clause 5
 */
export const xmpPacket = (about: About): string => {
  const date = `${about.created.toISOString().slice(0, 19)}Z`
  const producer = escapeXml(about.producer)
  return `<?xpacket begin="\ufeff" id="W5M0MpCehiHzreSzNTczkc9d"?>
<x:xmpmeta xmlns:x="adobe:ns:meta/"><rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#">
<rdf:Description rdf:about="" xmlns:dc="http://purl.org/dc/elements/1.1/">
<dc:format>application/pdf</dc:format>
${alternative('title', about.title)}<dc:creator><rdf:Seq><rdf:li>${escapeXml(about.author)}</rdf:li></rdf:Seq></dc:creator>
${about.subject === undefined ? '' : alternative('description', about.subject)}<dc:language><rdf:Bag><rdf:li>${about.language}</rdf:li></rdf:Bag></dc:language>
</rdf:Description>
<rdf:Description rdf:about="" xmlns:xmp="http://ns.adobe.com/xap/1.0/"><xmp:CreatorTool>${producer}</xmp:CreatorTool><xmp:CreateDate>${date}</xmp:CreateDate><xmp:ModifyDate>${date}</xmp:ModifyDate></rdf:Description>
<rdf:Description rdf:about="" xmlns:pdf="http://ns.adobe.com/pdf/1.3/"><pdf:Producer>${producer}</pdf:Producer></rdf:Description>
<rdf:Description rdf:about="" xmlns:pdfaid="http://www.aiim.org/pdfa/ns/id/"><pdfaid:part>${about.part}</pdfaid:part><pdfaid:conformance>${about.conformance}</pdfaid:conformance></rdf:Description>
${EXTENSION}</rdf:RDF></x:xmpmeta>
<?xpacket end="w"?>`
}
