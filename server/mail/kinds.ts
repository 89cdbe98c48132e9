/** Every kind of mail: its template, and whether people may switch it off. What an account needs cannot be. */
export const MAIL_KINDS = {
  invitation: { template: 'invitation', switchable: false },
  'password reset': { template: 'password-reset', switchable: false },
  'account notice': { template: 'account-notice', switchable: false },
  'review asked': { template: 'review-asked', switchable: true },
  'review submitted': { template: 'review-submitted', switchable: true },
  'report returned': { template: 'report-returned', switchable: true },
  'report approved': { template: 'report-approved', switchable: true },
  'report issued': { template: 'report-issued', switchable: true },
  'report replaced': { template: 'report-replaced', switchable: true },
  'report withdrawn': { template: 'report-withdrawn', switchable: true },
  'calibration due': { template: 'calibration-due', switchable: true },
  'verification due': { template: 'verification-due', switchable: true },
  checkpoint: { template: 'checkpoint', switchable: true },
} as const satisfies Readonly<Record<string, { readonly template: string; readonly switchable: boolean }>>

export type MailKind = keyof typeof MAIL_KINDS

export const isMailKind = (text: string): text is MailKind => Object.hasOwn(MAIL_KINDS, text)
