export { pathText, faultsOf, type Fault } from './faults';
export { parseExchange, type Parsed } from './parse';
export { ENDS } from './references';
export { writeExchange } from './write';
