export { prepareValidation, validateAnswer, validateRequest } from './validate';
