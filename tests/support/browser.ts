type Handler = (
  request: Request,
  next: { params: Promise<Record<string, string>> },
) => Promise<Response>;

/** What is sent, beside the cookie and what a browser adds by itself. */
export interface Sent {
  /** Text is sent as it stands, anything else as JSON. */
  readonly body?: unknown;
  /** Headers over those of a browser; undefined leaves one out. */
  readonly headers?: Readonly<Record<string, string | undefined>>;
  readonly params?: Readonly<Record<string, string>>;
  readonly path?: string;
}

export interface Answer {
  readonly status: number;
  readonly headers: Headers;
  // biome-ignore lint/suspicious/noExplicitAny: tests look into answers of every shape.
  readonly body: any;
}

export interface Browser {
  /** The cookie that would be sent, as `name=value`; may be set, to put a stolen one in. */
  cookie: string | undefined;
  call(handler: unknown, method: string, sent?: Sent): Promise<Answer>;
  get(handler: unknown, sent?: Sent): Promise<Answer>;
  post(handler: unknown, body?: unknown, sent?: Sent): Promise<Answer>;
}

function headersOf(cookie: string | undefined, sent: Sent): Record<string, string> {
  const all = {
    "sec-fetch-site": "same-origin",
    "user-agent": "a test",
    "content-type": sent.body === undefined ? undefined : "application/json",
    cookie,
    ...sent.headers,
  };
  return Object.fromEntries(
    Object.entries(all).filter((entry): entry is [string, string] => entry[1] !== undefined),
  );
}

/** The cookie a browser keeps after an answer. */
function cookieAfter(before: string | undefined, response: Response): string | undefined {
  const set = response.headers.get("set-cookie");
  if (set === null) return before;
  return /max-age=0\b/i.test(set) ? undefined : set.split(";")[0];
}

/** A browser in front of route handlers: it keeps its cookie and sends what browsers send. */
export function browser(): Browser {
  const self: Browser = {
    cookie: undefined,
    async call(handler, method, sent = {}) {
      const { body, params = {}, path = "/api" } = sent;
      const text = typeof body === "string" ? body : JSON.stringify(body);
      const request = new Request(`http://localhost:3000${path}`, {
        method,
        headers: headersOf(self.cookie, sent),
        ...(body === undefined ? {} : { body: text }),
      });
      const response = await (handler as Handler)(request, { params: Promise.resolve(params) });
      self.cookie = cookieAfter(self.cookie, response);
      const answer = await response.text();
      const { status, headers } = response;
      return { status, headers, body: answer ? JSON.parse(answer) : null };
    },
    get: (handler, sent) => self.call(handler, "GET", sent),
    post: (handler, body, sent) => self.call(handler, "POST", { ...sent, body }),
  };
  return self;
}
