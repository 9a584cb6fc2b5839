/** The cautions that method steps carry. Each is general guidance: local codes, the authority and trained people decide. */
export const KNIFE =
  'Knife work: chain-mail glove and apron on, the blade moved away from the body and the other hand.';
export const BAND_SAW =
  'Band saw: guard set to the piece, push block used, no gloves near the blade; stop and isolate before cleaning.';
export const RISK_MATERIAL =
  'Specified risk material is taken out and kept apart as category 3 or 1, as the competent authority rules; only trained people decide.';
export const OUTSIDE_IN =
  'Rolling brings the outside of the meat to the inside: it must be cooked through. General guidance; local codes govern.';
export const MINCED =
  'Mincing mixes the outside of the meat through it: it must be cooked through. General guidance; local codes govern.';
export const SCORED_THROUGH =
  'Scoring opens the surface: keep cuts out of the lean, and cook through where they reach it.';
