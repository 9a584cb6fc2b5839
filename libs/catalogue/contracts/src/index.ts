export {
  getCutTree,
  getSpecification,
  getStaffSpecification,
  listVersions,
  searchSpecifications,
  withdrawSpecification,
} from './catalogue.endpoints';
export {
  chosenWire,
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
