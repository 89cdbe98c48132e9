/** Whether an error of the file system says that there is nothing of that name. */
export const isMissing = (error: unknown): boolean =>
  error instanceof Error && 'code' in error && (error.code === 'ENOENT' || error.code === 'ENOTDIR')

/** The result, or nothing where there is no such file. */
export async function unlessMissing<Result>(work: Promise<Result>): Promise<Result | undefined> {
  try {
    return await work
  } catch (error) {
    if (isMissing(error)) return undefined
    throw error
  }
}
