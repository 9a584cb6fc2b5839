/** The species the house cuts. */
export const SPECIES = ['lamb', 'beef', 'pork'] as const;
export type Species = (typeof SPECIES)[number];

export const BONE_STATES = ['bone-in', 'boneless'] as const;
export type BoneState = (typeof BONE_STATES)[number];

export const PACK_TYPES = ['vacuum', 'modified-atmosphere', 'tray', 'paper'] as const;
export type PackType = (typeof PACK_TYPES)[number];

export const TEMPERATURE_STATES = ['chilled', 'frozen', 'defrosted'] as const;
export type TemperatureState = (typeof TEMPERATURE_STATES)[number];

export const AGEING_KINDS = ['dry-aged', 'wet-aged', 'hung'] as const;
export type AgeingKind = (typeof AGEING_KINDS)[number];

/** Which plan the drawing follows. */
export const DRAWING_KINDS = ['steak', 'joint', 'rack', 'flat', 'dice', 'leg'] as const;
export type DrawingKind = (typeof DRAWING_KINDS)[number];

/** The word for one piece. */
export const PIECE_KINDS = ['piece', 'steak', 'joint', 'rack', 'leg', 'chop', 'shank', 'bag'] as const;
export type PieceKind = (typeof PIECE_KINDS)[number];

/** What is done to a piece after it is trimmed. `plain` is nothing more. */
export const FINISHES = ['plain', 'scored', 'rolled', 'tied', 'squared', 'french-trimmed', 'diced', 'minced'] as const;
export type Finish = (typeof FINISHES)[number];

/** Where work is done. */
export const STATIONS = ['band-saw', 'boning', 'trimming', 'portioning', 'tying', 'packing'] as const;
export type Station = (typeof STATIONS)[number];

/** Joint products are wanted for their own sake, co-products are edible trim, by-products are not for people. */
export const OUTPUT_KINDS = ['joint-product', 'co-product', 'by-product'] as const;
export type OutputKind = (typeof OUTPUT_KINDS)[number];
