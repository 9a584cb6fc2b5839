/** What a packer can say of a pack outside its limits: touched, not typed. */
export const packReasons = (): readonly string[] => [
  $localize`:@@scale.reason.shape:Shape of the primal`,
  $localize`:@@scale.reason.lastPiece:Last piece of the lot`,
  $localize`:@@scale.reason.agreed:Agreed with the customer`,
  $localize`:@@scale.reason.trim:Trimmed closer`,
];

/** Why something can't be sent. */
export const shortReasons = (): readonly string[] => [
  $localize`:@@scale.short.noPrimal:No primal left`,
  $localize`:@@scale.short.quality:Quality not good enough`,
  $localize`:@@scale.short.outOfSpec:Out of specification`,
  $localize`:@@scale.short.time:Out of time`,
];
