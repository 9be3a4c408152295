export { servingQuantity } from '@merestone/engine';
