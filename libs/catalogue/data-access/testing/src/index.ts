export { aPublicSpecification } from './a-public-specification';
