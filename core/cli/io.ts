/**
 * Everything that the command line asks of the machine, as one object, so that tests can stand in for it.
 */

export interface Io {
  readonly cwd: string;
  readonly env: Readonly<Record<string, string | undefined>>;
  /** Is standard output a terminal, and how wide. */
  readonly isTerminal: boolean;
  readonly width: number | undefined;
  /** Is standard error a terminal: progress goes nowhere else. */
  readonly errorIsTerminal?: boolean;
  out(text: string): void;
  err(text: string): void;
  /** Bytes of a file; rejects as Node's file system does. */
  readFile(path: string): Promise<Uint8Array>;
  writeFile(path: string, text: string): Promise<void>;
  isFile(path: string): Promise<boolean>;
  /** Where the program's package lies, with its pages. */
  readonly packageFolder: string;
  /** ISO date of today: waivers run out. */
  today(): string;
  readInput(): Promise<Uint8Array>;
}
