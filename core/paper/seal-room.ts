import type { StructureElement } from 'pdfkit'
import type { PaperDocument } from './document.ts'
import { pdfString } from './pdf-string.ts'

/** Who will seal the document, as readers of PDF show it. */
export interface SealRoom {
  readonly name: string
  readonly reason: string
}

/** Bytes kept for the signature: enough for two chains of certificates and a time stamp. */
export const SEAL_BYTES = 16_384

/** Stands for an offset that is not known yet; every offset written over it is at most as long. */
const OPEN = 9_999_999_999
/** Stands for the time of sealing, and is as long as every time written over it. */
export const OPEN_TIME = 'D:00000000000000Z'

/** Print it, and let nobody move it (ISO 32000-1, table 165). */
const PRINT_AND_LOCKED = 132
/** The document has signatures, and may only be appended to (ISO 32000-1, table 219). */
const SIGNED_APPEND_ONLY = 3

/** No change at all is permitted after this signature (ISO 32000-1, 12.8.2.2, P = 1). */
const NO_CHANGES = [
  { Type: 'SigRef', TransformMethod: 'DocMDP', TransformParams: { Type: 'TransformParams', P: 1, V: '1.2' } },
]

/**
 * Keeps room for a seal: a signature that permits no change, in a field without size on the page that is being painted.
 * The field has its place in the structure tree (ISO 14289-1, 7.18.4).
 *
 * @param parent the element of the structure tree that it goes into
 */
export function keepRoomForSeal(doc: PaperDocument, parent: StructureElement, { name, reason }: SealRoom): void {
  const signature = doc.ref({
    Type: 'Sig',
    Filter: 'Adobe.PPKLite',
    SubFilter: 'ETSI.CAdES.detached',
    Name: pdfString(name),
    Reason: pdfString(reason),
    M: pdfString(OPEN_TIME),
    Reference: NO_CHANGES,
    ByteRange: [0, OPEN, OPEN, OPEN],
    Contents: new Uint8Array(SEAL_BYTES),
  })
  signature.end()
  const form = doc.struct('Form')
  parent.add(form)
  doc.annotate(0, 0, 0, 0, {
    Subtype: 'Widget',
    FT: 'Sig',
    T: pdfString('Seal'),
    TU: pdfString(`Seal of ${name}`),
    F: PRINT_AND_LOCKED,
    P: doc.page.dictionary,
    V: signature,
    structParent: form,
  })
  form.end()
  const fields = doc.ref({ Fields: doc.page.annotations.slice(-1), SigFlags: SIGNED_APPEND_ONLY })
  fields.end()
  doc.sealWith(fields, signature)
}
