export { Explain } from './Explain';
export { quantities, quantityIds, type QuantityHelp, type QuantityId } from './quantities';
export { QuantityText } from './QuantityText';
