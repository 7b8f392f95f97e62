export * from './quantity';
export * from './units';
export * from './convert';
export * from './decimal';
export * from './print-decimal';
export * from './print-inches';
export { parseQuantity, type ParsedQuantity, type ParseRefusal } from './parse-quantity';
