import { Agent, request, type IncomingMessage } from 'node:http';
import type { Answer, AnyEndpoint, CallInput } from '@seamwright/shared/contracts';
import { newId } from '@seamwright/shared/util';

export interface SentFile {
  readonly name: string;
  readonly bytes: Buffer;
}

type Sent<E extends AnyEndpoint> = Omit<CallInput<E>, 'file'> & { readonly file?: SentFile };

interface Parts {
  readonly params?: Readonly<Record<string, unknown>>;
  readonly query?: Readonly<Record<string, unknown>>;
  readonly body?: unknown;
  readonly ifMatch?: number;
  readonly idempotencyKey?: string;
  readonly file?: SentFile;
}

const BOUNDARY = 'seamwright-bench';

/** Calls declared endpoints over one kept connection. What is refused is thrown. */
export class ApiClient {
  readonly #agent = new Agent({ keepAlive: true, maxSockets: 1 });
  readonly #origin: string;

  constructor(origin: string) {
    this.#origin = origin;
  }

  async call<E extends AnyEndpoint>(token: string | null, endpoint: E, sent: Sent<E>): Promise<Answer<E>> {
    const bytes = await this.download(token, endpoint, sent);
    return (bytes.length > 0 ? JSON.parse(bytes.toString('utf8')) : undefined) as Answer<E>;
  }

  /** The same for an answer that is a file. */
  async download<E extends AnyEndpoint>(token: string | null, endpoint: E, sent: Sent<E>): Promise<Buffer> {
    const parts = sent as Parts;
    const { type, content } = contentOf(parts);
    const headers: Record<string, string | number> = { 'content-length': content.length };
    if (type) headers['content-type'] = type;
    if (token) headers['authorization'] = `Bearer ${token}`;
    if (parts.ifMatch !== undefined) headers['if-match'] = `"${parts.ifMatch}"`;
    if (endpoint.idempotent) headers['idempotency-key'] = parts.idempotencyKey ?? newId();
    const { status, bytes } = await this.#send(endpoint.method, addressOf(endpoint, parts), headers, content);
    if (status !== endpoint.status) throw new Error(`${endpoint.id} answered ${status}: ${bytes.toString('utf8')}`);
    return bytes;
  }

  close(): void {
    this.#agent.destroy();
  }

  #send(method: string, path: string, headers: Record<string, string | number>, content: Buffer) {
    return new Promise<{ status: number; bytes: Buffer }>((resolve, reject) => {
      const asking = request(`${this.#origin}/api/v1${path}`, { method, headers, agent: this.#agent }, (response) => {
        readAll(response).then((bytes) => resolve({ status: response.statusCode ?? 0, bytes }), reject);
      });
      asking.once('error', reject);
      asking.end(content);
    });
  }
}

function addressOf({ path }: AnyEndpoint, { params = {}, query = {} }: Parts): string {
  const place = path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String(params[name])));
  const asked = new URLSearchParams(Object.entries(query).map(([name, value]) => [name, String(value)]));
  return asked.size > 0 ? `${place}?${asked.toString()}` : place;
}

function contentOf({ body, file }: Parts): { type: string | null; content: Buffer } {
  if (file) {
    const head = `--${BOUNDARY}\r\ncontent-disposition: form-data; name="file"; filename="${file.name}"\r\n\r\n`;
    const content = Buffer.concat([Buffer.from(head), file.bytes, Buffer.from(`\r\n--${BOUNDARY}--\r\n`)]);
    return { type: `multipart/form-data; boundary=${BOUNDARY}`, content };
  }
  if (body === undefined) return { type: null, content: Buffer.alloc(0) };
  return { type: 'application/json', content: Buffer.from(JSON.stringify(body)) };
}

async function readAll(response: IncomingMessage): Promise<Buffer> {
  const chunks: Buffer[] = [];
  for await (const chunk of response) chunks.push(chunk as Buffer);
  return Buffer.concat(chunks);
}
