export interface Cluster {
  readonly port: number
  readonly url: string
}
export function postgresBin(): string
export function homeFor(...candidates: readonly string[]): string
export function freePort(): Promise<number>
export function startCluster(
  home: string,
  options?: { readonly quick?: boolean; readonly port?: number },
): Promise<Cluster>
export function stopCluster(home: string, mode?: 'smart' | 'fast' | 'immediate'): void
