export interface RunningDemo {
  readonly url: string;
  readonly accounts: { email: string; password: string; role: string }[];
  readonly keys: { role: string; secret: string }[];
  readonly dataDirectory: string;
  output(): string;
  stop(): Promise<void>;
}
export function startDemo(): Promise<RunningDemo>;
