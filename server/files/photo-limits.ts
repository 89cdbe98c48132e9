/** What a photo may be. Chosen for pictures from phones, and tried against hostile files on two cores. */
export const PHOTO_LIMITS = {
  /** Largest file in bytes: 15 MB. */
  bytes: 15_000_000,
  /** Most pixels before anything is decoded. */
  pixels: 50e6,
  /** Longest side of what is stored for the screen, in pixels. */
  stored: 2560,
  /** Longest side of what is printed, in pixels. */
  paper: 1600,
  /** JPEG quality of both. */
  quality: 82,
  /** Time for one photo in ms, from the start of its process. */
  time: 20_000,
  /** Work of the processor for one photo in seconds, which the kernel ends also where this server is gone. */
  work: 40,
  /** Memory that one photo's process may write to, in kibibytes. */
  memory: 655_360,
  /** Processes at once, over all requests of this server. */
  processes: 2,
  /** Photos that wait for one of them; more are asked to come again. */
  waiting: 64,
} as const
