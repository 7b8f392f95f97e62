import { createRouter, createWebHistory, type Router } from 'vue-router';
import { useSay } from '../composables/say';
import { guard } from './guard';
import { routes } from './routes';

/** The app's ways, with the guard in front of each and the page's name in the browser's title. */
export function makeRouter(): Router {
  const router = createRouter({
    history: createWebHistory(),
    routes,
    scrollBehavior: (to, from, saved) => {
      if (to.hash !== '') return to.path === from.path ? { el: to.hash } : false;
      return saved ?? { top: 0 };
    },
  });
  router.beforeEach(guard);
  router.afterEach((to) => {
    const { say } = useSay();
    document.title = to.meta.title === undefined ? say('app.name') : `${say(to.meta.title)} - ${say('app.name')}`;
  });
  return router;
}
