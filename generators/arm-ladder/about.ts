import type { About } from '../contract';

export const about: About = {
  id: 'arm-ladder',
  kind: 'coupons',
  name: 'Arm ladder',
  summary: 'The same arm again and again, each with a stop that lets it bend a little further.',
  rightWhen: 'You want to know what strain your plastic, printer and settings stand, and how often.',
  wrongWhen: 'You want to know a gap or a thread fit: take the ladder made for that.',
  bendsBy: 'bending, to a stop',
};
