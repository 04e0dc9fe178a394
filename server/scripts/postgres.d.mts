export interface Cluster {
  host: string;
  port: number;
  user: string;
  password: string;
  data: string;
  reused: boolean;
}
export interface ClusterOptions {
  folder?: string;
  port?: number;
  fast?: boolean;
  log?: (message: string) => void;
}
export const DATA_FOLDER: string;
export function start(options?: ClusterOptions): Promise<Cluster>;
export function stop(options?: { folder?: string; mode?: 'fast' | 'immediate' }): Promise<boolean>;
export function discard(options: { folder: string }): Promise<void>;
export function addressOf(
  cluster: Pick<Cluster, 'host' | 'port' | 'user' | 'password'>,
  database: string,
): string;
export function freePort(wanted?: number): Promise<number>;
export function connects(port: number): Promise<boolean>;
export function aptInstall(name: string): void;
