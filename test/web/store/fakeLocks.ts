/** Web locks as the standard describes them, for one lock name: a queue, `ifAvailable`, `steal` and abort. */

type Hold = (lock: Lock | null) => unknown;
interface Request {
  readonly hold: Hold;
  readonly resolve: (value: unknown) => void;
  readonly reject: (error: unknown) => void;
}

export function fakeLocks(): Pick<LockManager, 'request'> {
  const queue: Request[] = [];
  let holder: Request | null = null;
  const aborted = () => new DOMException('The lock was taken away', 'AbortError');

  const grant = (request: Request) => {
    holder = request;
    const end = () => {
      if (holder !== request) return;
      holder = null;
      const next = queue.shift();
      if (next) grant(next);
    };
    Promise.resolve(request.hold({ name: 'lock', mode: 'exclusive' }))
      .then(request.resolve, request.reject)
      .then(end);
  };

  const admit = (request: Request, options: LockOptions) => {
    if (options.steal) {
      holder?.reject(aborted());
      grant(request);
    } else if (!holder) grant(request);
    else if (options.ifAvailable) request.resolve(request.hold(null));
    else {
      queue.push(request);
      options.signal?.addEventListener('abort', () => {
        const place = queue.indexOf(request);
        if (place < 0) return;
        queue.splice(place, 1);
        request.reject(aborted());
      });
    }
  };

  const request = (_name: string, options: LockOptions, hold: Hold) =>
    new Promise((resolve, reject) => {
      queueMicrotask(() => admit({ hold, resolve, reject }, options));
    });
  return { request } as Pick<LockManager, 'request'>;
}
