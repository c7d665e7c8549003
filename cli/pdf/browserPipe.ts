import { type ChildProcess, spawn } from 'node:child_process';
import { Duplex, type Readable, type Writable } from 'node:stream';
import { StringDecoder } from 'node:string_decoder';

/** What a browser answers, as far as printing needs it. */
export interface Answered {
  readonly targetId?: string;
  readonly sessionId?: string;
  readonly data?: string;
  /** Why a page could not be opened. */
  readonly errorText?: string;
}

interface Message {
  readonly id?: number;
  readonly method?: string;
  readonly result?: Answered;
  readonly error?: { readonly message: string };
}

interface Waiting {
  readonly resolve: (answered: Answered) => void;
  readonly reject: (fault: Error) => void;
}

/** Ends a message of the protocol. */
const END = '\0';

/**
 * A browser that is spoken to over two pipes: it opens no port, and no other program can reach it.
 *
 * Reference: Chrome DevTools Protocol over `--remote-debugging-pipe`: JSON, a zero byte behind each message.
 */
export class BrowserPipe {
  readonly #child: ChildProcess;
  readonly #toBrowser: Writable;
  readonly #waiting = new Map<number, Waiting>();
  readonly #events = new Map<string, Pick<Waiting, 'reject'> & { readonly resolve: () => void }>();
  #last = 0;
  #ended: Error | undefined;

  constructor(program: string, flags: readonly string[], env: Readonly<Record<string, string>>) {
    this.#child = spawn(program, [...flags, '--remote-debugging-pipe', 'about:blank'], {
      env: { ...process.env, ...env },
      stdio: ['ignore', 'ignore', 'ignore', 'pipe', 'pipe'],
    });
    const [, , , toBrowser, fromBrowser] = this.#child.stdio;
    if (!(toBrowser instanceof Duplex) || !(fromBrowser instanceof Duplex)) throw new Error('there are no pipes');
    this.#toBrowser = toBrowser;
    // A broken pipe tells less than the end of the browser, which follows it.
    toBrowser.on('error', () => {});
    this.#listen(fromBrowser);
    this.#child.on('error', (fault) => this.#end(fault.message));
    this.#child.on('close', (code, signal) =>
      this.#end(signal === null ? `it ended with code ${code}` : `it was ended by ${signal}`),
    );
  }

  /** Asks for something. @throws Error where the browser refuses or has ended */
  ask(method: string, params: object, sessionId?: string): Promise<Answered> {
    if (this.#ended !== undefined) return Promise.reject(this.#ended);
    this.#last++;
    const id = this.#last;
    const message = { id, method, params, ...(sessionId === undefined ? {} : { sessionId }) };
    return new Promise((resolve, reject) => {
      this.#waiting.set(id, { resolve, reject });
      this.#toBrowser.write(JSON.stringify(message) + END);
    });
  }

  /** Resolves when something has happened; ask for it before it can happen. @throws Error where the browser has ended */
  happens(method: string): Promise<void> {
    return new Promise((resolve, reject) => this.#events.set(method, { resolve, reject }));
  }

  /** Ends the browser, and waits until it has ended. */
  close(): Promise<void> {
    return new Promise((resolve) => {
      if (this.#child.exitCode !== null || this.#child.signalCode !== null || this.#child.pid === undefined) resolve();
      else {
        this.#child.once('close', () => resolve());
        this.#child.kill('SIGKILL');
      }
    });
  }

  #listen(fromBrowser: Readable): void {
    const decoder = new StringDecoder('utf8');
    let text = '';
    fromBrowser.on('error', () => {});
    fromBrowser.on('data', (piece: Buffer) => {
      const parts = (text + decoder.write(piece)).split(END);
      text = parts.pop() ?? '';
      for (const part of parts) this.#take(JSON.parse(part));
    });
  }

  #take({ id, method, result, error }: Message): void {
    if (method !== undefined) this.#events.get(method)?.resolve();
    const waiting = id === undefined ? undefined : this.#waiting.get(id);
    if (id === undefined || waiting === undefined) return;
    this.#waiting.delete(id);
    if (error === undefined) waiting.resolve(result ?? {});
    else waiting.reject(new Error(error.message));
  }

  #end(why: string): void {
    this.#ended ??= new Error(why);
    for (const { reject } of [...this.#waiting.values(), ...this.#events.values()]) reject(this.#ended);
    this.#waiting.clear();
  }
}
