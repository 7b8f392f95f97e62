import entryWords from './job/hold-point';
import siteWords from './job/site';

/** The working pages: the job, its site panel and its hold points. */
export default { ...siteWords, point: entryWords };
