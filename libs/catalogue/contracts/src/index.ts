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
