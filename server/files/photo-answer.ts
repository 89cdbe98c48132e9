/** Why a photo was not taken. */
export type PhotoProblem =
  | { readonly code: 'empty' }
  | { readonly code: 'too-large'; readonly bytes: number }
  | { readonly code: 'not-a-photo'; readonly kind: string }
  | { readonly code: 'not-readable-here'; readonly kind: string }
  | { readonly code: 'too-many-pixels'; readonly width: number; readonly height: number }
  | { readonly code: 'moving' }
  | { readonly code: 'damaged' }
  | { readonly code: 'too-heavy' }
  | { readonly code: 'too-slow' }
  | { readonly code: 'busy' }

export interface Picture {
  readonly bytes: Buffer
  readonly width: number
  readonly height: number
}

export interface Photo {
  /** For the screen. */
  readonly stored: Picture
  /** For paper. */
  readonly paper: Picture
  /** When the camera says that it was taken, as it says it: local time without zone, not verified. */
  readonly taken: string | null
}

export type PhotoAnswer =
  | { readonly ok: true; readonly photo: Photo }
  | { readonly ok: false; readonly problem: PhotoProblem }
