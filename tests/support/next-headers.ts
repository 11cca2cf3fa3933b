/** The request a test is in: its head, and the cookies of its browser. */
export const request = { jar: new Map<string, string>(), head: new Headers() };

interface CookieOptions {
  readonly maxAge?: number;
}

export const headers = async (): Promise<Headers> => request.head;

export const cookies = async () => ({
  get: (name: string) => {
    const value = request.jar.get(name);
    return value === undefined ? undefined : { name, value };
  },
  set: (name: string, value: string, options: CookieOptions = {}) => {
    if (options.maxAge === 0) request.jar.delete(name);
    else request.jar.set(name, value);
  },
});
