export { approveVersion } from './approve-version';
export { catalogueImplementations } from './catalogue.router';
export { addCutNodes, cutNodes } from './cut-nodes.repository';
export { currentVersions, specificationsByCodes, versionsByIds } from './specifications.repository';
export { withdrawSpecification } from './withdraw-specification';
export { createSpecification, createVersion, submitVersion } from './write-version';
