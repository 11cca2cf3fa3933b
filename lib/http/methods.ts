import { RequestProblem } from './problem';
import { route } from './route';

/** Answers the methods an address does not take, naming those it does. */
export const takesOnly = (allowed: string) =>
  route({
    rateLimit: 'reads',
    handler: ({ request }) => {
      const detail = `${request.method} is not taken here; use ${allowed}.`;
      throw new RequestProblem('method-not-allowed', detail, { Allow: allowed });
    },
  });

export const takesGet = takesOnly('GET');
export const takesPost = takesOnly('POST');
export const takesGetAndPost = takesOnly('GET, POST');
