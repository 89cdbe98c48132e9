import { S3Client } from '@aws-sdk/client-s3'

export interface S3Settings {
  readonly endpoint?: string
  readonly region: string
  readonly accessKeyId: string
  readonly secretAccessKey: string
  /** Bucket in the path instead of the host name, as most servers outside the large clouds want it. */
  readonly pathStyle: boolean
}

/** How long each step of a request may take, in ms. */
export const S3_TIMES = { connection: 3_000, idle: 10_000, request: 60_000 } as const

type Times = { readonly [Step in keyof typeof S3_TIMES]: number }

/** A client that gives up: no request waits for ever, and a broken one is tried three times. */
export function s3Client(
  { endpoint, region, accessKeyId, secretAccessKey, pathStyle }: S3Settings,
  times: Times = S3_TIMES,
): S3Client {
  return new S3Client({
    ...(endpoint === undefined ? {} : { endpoint }),
    region,
    credentials: { accessKeyId, secretAccessKey },
    forcePathStyle: pathStyle,
    maxAttempts: 3,
    requestHandler: {
      connectionTimeout: times.connection,
      socketTimeout: times.idle,
      requestTimeout: times.request,
      // Otherwise the time is only written to the log.
      throwOnRequestTimeout: true,
    },
    // Otherwise the client frames bodies in a way that servers outside the large clouds store as content.
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  })
}
