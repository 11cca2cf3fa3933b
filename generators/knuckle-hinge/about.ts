import type { About } from '../contract';

export const about: About = {
  id: 'knuckle-hinge',
  kind: 'hinges',
  name: 'Knuckle hinge',
  summary: 'Two leaves on a pin, printed in one another: it turns as it comes off the bed.',
  rightWhen: 'A lid or flap turns often and far, in any plastic, and carries some load.',
  wrongWhen: 'It must not rattle, or the printer cannot keep a gap of a quarter of a millimetre open.',
  bendsBy: 'turning on its pin',
};
