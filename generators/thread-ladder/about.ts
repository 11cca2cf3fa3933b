import type { About } from '../contract';

export const about: About = {
  id: 'thread-ladder',
  kind: 'coupons',
  name: 'Thread ladder',
  summary: 'A row of threaded holes with stepped clearance, and one stud that tries them all.',
  rightWhen: 'You want to know at which clearance your printed threads turn freely without wobbling.',
  wrongWhen: 'You want a plain gap: take the clearance ladder.',
  bendsBy: 'nothing: threads are tried',
};
