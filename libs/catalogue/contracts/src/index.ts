export {
  getCutTree,
  getSpecification,
  getStaffSpecification,
  listVersions,
  withdrawSpecification,
} from './catalogue.endpoints';
export {
  addComment,
  approveReviewed,
  discardDraft,
  getDraft,
  listComments,
  listDrafts,
  openDraft,
  openSpecification,
  saveDraft,
  sendBackReviewed,
  submitDraft,
  type SpecificationComment,
  type SpecificationDraft,
  type SpecificationDraftRow,
} from './drafts.endpoints';
export {
  chosenWire,
  type DraftContentWire,
  type PublicSpecification,
  type SpecificationCard,
  type SpecificationRow,
  type StaffSpecification,
} from './specification.wire';
export type {
  AdoptionAnswer,
  CutOutAnswer,
  CuttingTestWire,
  NewTest,
  SchemeContentWire,
  SchemeRecord,
  SchemeRow,
  TestImportWire,
  YieldsAnswer,
} from './cutting.wire';
export { createScheme, getCutOut, getScheme, listSchemes, moveScheme, saveSchemeDraft } from './schemes.endpoints';
export {
  adoptYields,
  getTestImport,
  getTestTemplate,
  getYields,
  judgeTest,
  listTests,
  recordTest,
  takeTests,
  uploadTests,
} from './yields.endpoints';
export { addUneceValue, correctUneceValue, listUneceValues, readUnece } from './unece.endpoints';
export type { UneceReadingWire, UneceValueWire, VersionUneceCode } from './unece.wire';
export { SEARCH_SORTS, searchSpecifications, type SearchSort } from './search.endpoints';
export { addSynonym, listSynonyms, removeSynonym, type SynonymWire } from './synonyms.endpoints';
