import { S3Client } from '@aws-sdk/client-s3'

export interface S3Settings {
  readonly endpoint?: string
  readonly region: string
  readonly accessKeyId: string
  readonly secretAccessKey: string
  /** Bucket in the path instead of the host name, as most servers outside the large clouds want it. */
  readonly pathStyle: boolean
}

/** A client that gives up: no request waits for ever, and a broken one is tried three times. */
export function s3Client({ endpoint, region, accessKeyId, secretAccessKey, pathStyle }: S3Settings): S3Client {
  return new S3Client({
    ...(endpoint === undefined ? {} : { endpoint }),
    region,
    credentials: { accessKeyId, secretAccessKey },
    forcePathStyle: pathStyle,
    maxAttempts: 3,
    requestHandler: { connectionTimeout: 3_000, requestTimeout: 30_000 },
    // Otherwise the client frames bodies in a way that servers outside the large clouds store as content.
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  })
}
