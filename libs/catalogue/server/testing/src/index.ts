export { addTestPeople, type TestPeople } from './test-people';
export { addTestSpecification } from './test-specification';
export { addTestTree, type TestTree } from './test-tree';
