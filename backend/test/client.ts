import { DEMO_PASSWORD } from '../src/auth/demo-people.js';
import { type ResponseChecker } from './response-checker.js';

export interface Answer<T = unknown> {
  status: number;
  headers: Headers;
  /** Parsed JSON; undefined when the answer is something else. */
  body: T;
  bytes: Buffer;
}

export interface RequestDetails {
  body?: unknown;
  headers?: Record<string, string>;
}

/** A person's browser without the screens: keeps the cookie, and checks every answer against the document. */
export class Client {
  cookie: string | null = null;

  constructor(
    readonly baseUrl: string,
    private readonly checker: ResponseChecker,
  ) {}

  async signIn(email: string, password = DEMO_PASSWORD): Promise<this> {
    const answer = await this.post('/api/auth/sign-in', { email, password });
    if (answer.status !== 200) throw new Error(`${email} cannot sign in: ${JSON.stringify(answer.body)}`);
    return this;
  }

  get<T = unknown>(path: string, headers?: Record<string, string>): Promise<Answer<T>> {
    return this.send<T>('GET', path, { headers });
  }

  post<T = unknown>(path: string, body?: unknown): Promise<Answer<T>> {
    return this.send<T>('POST', path, { body });
  }

  put<T = unknown>(path: string, body?: unknown): Promise<Answer<T>> {
    return this.send<T>('PUT', path, { body });
  }

  patch<T = unknown>(path: string, body?: unknown): Promise<Answer<T>> {
    return this.send<T>('PATCH', path, { body });
  }

  delete<T = unknown>(path: string, body?: unknown): Promise<Answer<T>> {
    return this.send<T>('DELETE', path, { body });
  }

  /** @param details a body that is text is sent as it stands, anything else as JSON */
  async send<T = unknown>(
    method: string,
    path: string,
    { body, headers }: RequestDetails = {},
  ): Promise<Answer<T>> {
    const response = await fetch(this.baseUrl + path, {
      method,
      headers: {
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...(this.cookie && { cookie: this.cookie }),
        ...headers,
      },
      ...(body === undefined ? {} : { body: typeof body === 'string' ? body : JSON.stringify(body) }),
    });
    this.keepCookie(response);
    const contentType = response.headers.get('content-type') ?? '';
    const bytes = Buffer.from(await response.arrayBuffer());
    const isJson = contentType.startsWith('application/json') && bytes.length > 0;
    const parsed: unknown = isJson ? JSON.parse(bytes.toString('utf8')) : undefined;
    this.checker.check({ method, path, status: response.status, contentType, body: parsed });
    return { status: response.status, headers: response.headers, body: parsed as T, bytes };
  }

  /**
   * Opens a stream of server-sent events and hands on each event's data as it comes.
   * @throws Error when the answer is no event stream
   */
  async *events(path: string, signal?: AbortSignal): AsyncGenerator<{ event: string; data: unknown }> {
    const headers: Record<string, string> = this.cookie ? { cookie: this.cookie } : {};
    const response = await fetch(this.baseUrl + path, { headers, signal: signal ?? null });
    if (!response.body || !response.headers.get('content-type')?.startsWith('text/event-stream')) {
      throw new Error(`${path} answers ${response.status}, no event stream.`);
    }
    let pending = '';
    for await (const chunk of response.body.pipeThrough(new TextDecoderStream())) {
      const blocks = (pending + chunk).split('\n\n');
      pending = blocks.pop() ?? '';
      for (const block of blocks) {
        const fields = new Map(
          block.split('\n').map((line) => line.split(/: ?(.*)/s, 2) as [string, string]),
        );
        const data = fields.get('data');
        if (data) yield { event: fields.get('event') ?? 'message', data: JSON.parse(data) as unknown };
      }
    }
  }

  private keepCookie(response: Response): void {
    const [first] = response.headers.getSetCookie();
    if (first === undefined) return;
    const pair = first.split(';', 1)[0] ?? '';
    this.cookie = pair.endsWith('=') ? null : pair;
  }
}
