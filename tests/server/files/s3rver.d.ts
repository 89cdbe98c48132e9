declare module 's3rver' {
  /** The part of the local S3 server that the tests use. */
  export default class S3rver {
    constructor(options: {
      readonly address: string
      readonly port: number
      readonly silent: boolean
      readonly directory: string
      readonly configureBuckets: readonly { readonly name: string }[]
    })
    run(): Promise<{ readonly port: number }>
    close(): Promise<void>
  }
}
