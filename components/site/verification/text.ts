/** What the tests hold the solver to, with the tolerance they allow. */
export const PUBLISHED: readonly string[] = [
  'Patch test: a state of constant strain comes back exact to round-off on any mesh.',
  'Manufactured solutions: the error falls with the third power of the edge length in displacement and with the second in strain, as six-node triangles should.',
  'NAFEMS LE1, elliptic membrane: 92.7 MPa at point D, within 2 %.',
  'Kirsch, plate with a round hole: three times the far strain at the edge of the hole, within 1 %.',
  'Lamé, thick cylinder under inner pressure: hoop stress and growth of the bore, within 1 %.',
  'Bisshopp and Drucker, elastica: force and tip of a slender arm at tip angles up to 63°, within 0.5 %.',
  'Timoshenko and Goodier, curved bar: stress at both faces of a crane hook, within 0.5 %; the printed example of Shigley, found with Winkler-Bach theory, within 6 %.',
];

/** What stays outside the model. */
export const LIMITS: readonly string[] = [
  'Contact, friction, yielding and creep. A part that yields first is judged by its strain, not followed past it.',
  'The width. The plane sees one outline; where a base or wall is wider than the arm, the part’s page names the factor and its cause.',
  'A sharp inner corner, whose strain has no limit: the formulas say so, and nothing is computed there.',
  'The lines and voids of a print. Layers enter through the allowed strain and, where the plastic’s stiffness across them is known, through the stiffness.',
  'Threads, twisting bars, rings and plates, which are no flat outline: their verdicts stand on the formulas.',
];
