import common from './limits/common';
import fitUp from './limits/fit-up';
import stub from './limits/stub';
import welding from './limits/welding';
import test from './limits/test';

/** What each limit says when it is kept and when it is not: what is wrong, by how much, what can be done now. */
export default { ...common, ...stub, ...fitUp, ...welding, ...test };
