import * as z from 'zod';
import {
  OUTPUT_KINDS,
  SCHEME_KINDS,
  SPECIES,
  STANDINGS,
  TEST_VERDICTS,
  VERSION_STATES,
} from '@seamwright/catalogue/domain';
import { gramsWire, id, instant, line, minor, note, plantDay, ppmWire, rowVersion } from '@seamwright/shared/contracts';

/** A scheme's code: CS-101. Whatever else may be tested has a specification's code. */
export const schemeCode = z.string().regex(/^CS-\d{3}$/);
export const subjectCode = z
  .string()
  .regex(/^[A-Z]{2}-\d{3}$/)
  .meta({ description: 'The code of a cutting scheme (CS-101) or of a specification' });

/** No piece, and no test, weighs more than a hundred tonnes. */
const weighed = gramsWire.max(100_000_000);
const key = z.string().min(1).max(60);
const lean = z.int().min(-1_000).max(1_000).meta({ description: 'Visual lean, per cent' });
const parts = ppmWire.min(-10_000_000).max(10_000_000);

const schemeOutput = z.strictObject({
  key,
  name: line(80),
  kind: z.enum(OUTPUT_KINDS),
  nodeId: id.nullable().meta({ description: 'Where a joint product stands in the cut tree; null for the others' }),
  yieldPpm: parts,
  valueMinorPerKg: minor.min(-100_000_000).max(100_000_000),
  visualLean: lean.optional(),
});

const ingredient = z.strictObject({
  name: line(80),
  ppmOfInput: parts,
  allergens: z.array(line(60)).max(20),
  declared: z.boolean(),
});

const blend = z.strictObject({
  parts: z
    .array(z.strictObject({ name: line(80), visualLean: lean, tolerance: lean, sharePpm: parts }))
    .min(1)
    .max(20),
  leastLean: lean,
  mostLean: lean,
});

/** What an author writes of a scheme. A draft may have faults: they are answered, and refused when it is submitted. */
export const schemeContent = z.strictObject({
  name: line(120),
  kind: z.enum(SCHEME_KINDS),
  inputNodeId: id,
  outputs: z.array(schemeOutput).max(40),
  ingredients: z.array(ingredient).max(40),
  blend: blend.nullable(),
  note: note(),
});
export type SchemeContentWire = z.infer<typeof schemeContent>;

const standingFields = {
  version: z.int().positive(),
  state: z.enum(VERSION_STATES),
  standing: z.enum(STANDINGS).nullable(),
};

const faultWire = z.strictObject({ code: z.string(), pointer: z.string(), message: z.string() });

/** One version of a scheme, with what follows from it and the list of its versions. */
export const schemeRecord = z.strictObject({
  schemeId: id,
  versionId: id,
  code: schemeCode,
  species: z.enum(SPECIES),
  rowVersion,
  ...standingFields,
  content: schemeContent,
  /** Names of the nodes that the content speaks of. */
  nodeNames: z.record(z.string(), z.string()),
  addedPpm: ppmWire,
  lossPpm: ppmWire.meta({ description: 'What goes in less what comes out; below zero in a faulty draft' }),
  /** Visual lean of a blend, per cent over 1,000,000: as stated, and as far as the tolerances reach. */
  lean: z
    .strictObject({
      statedPpm: ppmWire,
      leastPpm: ppmWire,
      mostPpm: ppmWire,
      within: z.enum(['always', 'as-stated', 'no']),
    })
    .nullable(),
  /** What each thing is of a recipe's mixing bowl; empty for anything else. */
  recipe: z.array(z.strictObject({ name: z.string(), sharePpm: ppmWire, declared: z.boolean() })),
  faults: z.array(faultWire),
  authorName: z.string(),
  approverName: z.string().nullable(),
  approvedAt: instant.nullable(),
  tests: z.int().nonnegative(),
  versions: z.array(z.strictObject({ ...standingFields, since: instant.nullable(), reason: z.string().nullable() })),
});
export type SchemeRecord = z.infer<typeof schemeRecord>;

/** A row of the list: the newest version of each scheme. */
export const schemeRow = z.strictObject({
  code: schemeCode,
  name: z.string(),
  kind: z.enum(SCHEME_KINDS),
  species: z.enum(SPECIES),
  inputNodeId: id,
  inputName: z.string(),
  outputs: z.int().nonnegative(),
  lossPpm: ppmWire,
  ...standingFields,
});
export type SchemeRow = z.infer<typeof schemeRow>;

/** A piece broken down to the end. Shares are rounded for showing; the grams add to the piece exactly. */
export const cutOutAnswer = z.strictObject({
  nodeId: id,
  nodeName: z.string(),
  grams: gramsWire,
  lines: z.array(
    z.strictObject({
      key: z.string(),
      name: z.string(),
      kind: z.enum(OUTPUT_KINDS),
      nodeId: id.nullable(),
      visualLean: z.int().nullable(),
      valueMinorPerKg: minor,
      through: z.array(z.string()),
      sharePpm: ppmWire,
      grams: gramsWire,
    }),
  ),
  loss: z.strictObject({ sharePpm: ppmWire, grams: gramsWire }),
  totals: z.strictObject({ jointPpm: ppmWire, coPpm: ppmWire, byPpm: ppmWire, lossPpm: ppmWire }),
});
export type CutOutAnswer = z.infer<typeof cutOutAnswer>;

/** A test as it is typed: every output of the subject once, at 0 where nothing came out. */
export const newTest = z.strictObject({
  subject: subjectCode,
  input: z.strictObject({
    lotCode: note(60),
    supplier: note(120),
    grade: note(40),
    pieces: z.int().min(0).max(100_000),
    grams: weighed,
    addedGrams: weighed,
  }),
  outputs: z.array(z.strictObject({ key, grams: weighed })).max(60),
  testedOn: plantDay,
  note: note(),
});
export type NewTest = z.infer<typeof newTest>;

export const cuttingTest = z.strictObject({
  id,
  rowVersion,
  subject: subjectCode,
  subjectName: z.string(),
  lotCode: z.string(),
  supplier: z.string(),
  grade: z.string(),
  pieces: z.int(),
  inputGrams: gramsWire,
  addedGrams: gramsWire,
  outputs: z.array(z.strictObject({ key: z.string(), name: z.string(), grams: gramsWire, yieldPpm: ppmWire })),
  lossGrams: gramsWire,
  testedOn: plantDay,
  note: z.string(),
  recordedBy: z.string(),
  verdict: z.enum(TEST_VERDICTS).nullable(),
  verdictReason: z.string().nullable(),
});
export type CuttingTestWire = z.infer<typeof cuttingTest>;

const estimate = z.strictObject({
  n: z.int().positive(),
  inputGrams: gramsWire,
  outputGrams: gramsWire,
  yieldPpm: ppmWire,
  deviationPpm: ppmWire.nullable(),
  interval: z.strictObject({ leastPpm: ppmWire, mostPpm: ppmWire }).nullable(),
});
const group = z.strictObject({ name: z.string(), ...estimate.shape });

/** The yields of a subject by its tests, with a point for each test so that they can be plotted. */
export const yieldsAnswer = z.strictObject({
  subject: subjectCode,
  name: z.string(),
  version: z.int().positive(),
  outputs: z.array(
    z.strictObject({
      key: z.string(),
      name: z.string(),
      kind: z.enum(OUTPUT_KINDS),
      /** What the version says now. */
      statedPpm: ppmWire,
      measured: estimate.nullable(),
      byGrade: z.array(group),
      bySupplier: z.array(group),
      points: z.array(
        z.strictObject({
          testId: id,
          testedOn: plantDay,
          supplier: z.string(),
          grade: z.string(),
          inputGrams: gramsWire,
          yieldPpm: ppmWire,
          standsOut: z.boolean().meta({ description: 'More than three deviations from the other tests that count' }),
          counts: z.boolean(),
        }),
      ),
    }),
  ),
  /** Tests that stand out and that nobody has kept or set aside yet. */
  awaiting: z.array(id),
  /** What the joint products cost at the price that was asked about; null without one, or without tests. */
  cost: z
    .strictObject({
      inputMinorPerKg: minor,
      usablePpm: ppmWire,
      creditMinorPerKg: minor,
      usableMinorPerKg: minor,
      factorPpm: ppmWire.meta({ description: 'Usable cost over the price paid' }),
    })
    .nullable(),
});
export type YieldsAnswer = z.infer<typeof yieldsAnswer>;

/** A new version in review with the yields of the tests, and what reads them. */
export const adoptionAnswer = z.strictObject({
  subject: subjectCode,
  version: z.int().positive(),
  versionId: id,
  state: z.enum(VERSION_STATES),
  tests: z.int().nonnegative(),
  outputs: z.array(
    z.strictObject({ key: z.string(), name: z.string(), beforePpm: ppmWire.nullable(), afterPpm: ppmWire }),
  ),
  readBy: z.strictObject({
    specifications: z.array(z.strictObject({ code: z.string(), name: z.string() })),
    priceLines: z.int().nonnegative().meta({ description: 'Price lines in force now or later' }),
    openOrderLines: z.int().nonnegative().meta({ description: 'Ordered lines that are still to be delivered' }),
  }),
});
export type AdoptionAnswer = z.infer<typeof adoptionAnswer>;

/** A workbook of tests: what would be recorded, and every faulty cell of the other rows. */
export const testImport = z.strictObject({
  id,
  rowVersion,
  fileName: z.string(),
  uploadedAt: instant,
  rows: z.int().nonnegative(),
  tests: z.array(
    z.strictObject({
      row: z.int().positive(),
      subject: subjectCode,
      subjectName: z.string(),
      testedOn: plantDay,
      lotCode: z.string(),
      supplier: z.string(),
      grade: z.string(),
      pieces: z.int(),
      inputGrams: gramsWire,
      addedGrams: gramsWire,
      lossGrams: gramsWire,
      outputs: z.array(z.strictObject({ name: z.string(), grams: gramsWire })),
    }),
  ),
  faults: z.array(
    z.strictObject({ row: z.int().positive(), column: z.string(), code: z.string(), message: z.string() }),
  ),
  /** When the very same file was taken before. */
  sameFileTakenAt: instant.nullable(),
  taken: z.enum(['good-rows', 'all-or-none']).nullable(),
  takenAt: instant.nullable(),
  recorded: z.array(id),
});
export type TestImportWire = z.infer<typeof testImport>;
