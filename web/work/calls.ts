/**
 * Calls across to a worker: arguments are copied, one function among them hears how far the call is, and the answer or
 * the failure comes back. Cancelling is ending the worker, so that nothing more is needed here.
 */
type OnShare = (share: number) => void;

/** The calls as the page sees them. */
export type Remote<Calls> = {
  readonly [Name in keyof Calls]: Calls[Name] extends (...args: infer Args) => infer Answer
    ? (...args: Args) => Promise<Awaited<Answer>>
    : never;
};

interface Request {
  readonly id: number;
  readonly name: string;
  readonly args: readonly unknown[];
  /** Which argument hears the share; −1 for none. */
  readonly listensAt: number;
}

type Reply = { readonly id: number } & (
  | { readonly share: number }
  | { readonly answer: unknown }
  | { readonly message: string }
);

interface Waiting {
  readonly onShare: OnShare | undefined;
  readonly resolve: (answer: unknown) => void;
  readonly reject: (error: Error) => void;
}

/** The page's side. */
export function remoteCalls<Calls>(worker: Worker): Remote<Calls> {
  const waiting = new Map<number, Waiting>();
  let count = 0;
  worker.addEventListener('message', ({ data }: MessageEvent<Reply>) => {
    const call = waiting.get(data.id);
    if (!call) return;
    if ('share' in data) return call.onShare?.(data.share);
    waiting.delete(data.id);
    if ('answer' in data) call.resolve(data.answer);
    else call.reject(new Error(data.message));
  });
  const call = (name: string, given: readonly unknown[]) => {
    count += 1;
    const id = count;
    const listensAt = given.findIndex((argument) => typeof argument === 'function');
    const args = given.map((argument, index) => (index === listensAt ? null : argument));
    return new Promise((resolve, reject) => {
      waiting.set(id, { onShare: given[listensAt] as OnShare | undefined, resolve, reject });
      worker.postMessage({ id, name, args, listensAt } satisfies Request);
    });
  };
  const answering =
    (_: object, name: string) =>
    (...given: readonly unknown[]) =>
      call(name, given);
  return new Proxy({}, { get: answering }) as Remote<Calls>;
}

/** The part of a worker's global scope that answers need. */
interface Scope {
  addEventListener(type: 'message', listener: (event: MessageEvent<Request>) => void): void;
  postMessage(reply: Reply, transfer: Transferable[]): void;
}

type AnyCalls = Readonly<Record<string, (...args: never[]) => unknown>>;

/** The worker's side; `handedOver` names the buffers of an answer that need not be copied. */
export function answerCalls(calls: AnyCalls, handedOver: (answer: unknown) => Transferable[] = () => []): void {
  const scope = globalThis as unknown as Scope;
  scope.addEventListener('message', ({ data }) => {
    const { id, name, args, listensAt } = data;
    const onShare: OnShare = (share) => scope.postMessage({ id, share }, []);
    const given = args.map((argument, index) => (index === listensAt ? onShare : argument));
    try {
      const call = calls[name];
      if (!call) throw new Error(`Expected a call of this worker, got “${name}”`);
      const answer = call(...(given as never[]));
      scope.postMessage({ id, answer }, handedOver(answer));
    } catch (error) {
      scope.postMessage({ id, message: error instanceof Error ? error.message : String(error) }, []);
    }
  });
}
