import type { RouteRecordRaw } from 'vue-router';
import type { HousePermission } from '../../shared/permissions/grants';

declare module 'vue-router' {
  interface RouteMeta {
    /** Open to whoever has this permission; a job's own pages leave the question to the server, which knows the job. */
    permission?: HousePermission;
    /** Open without signing in. */
    public?: boolean;
    /** Message key of the page's name in the browser's title. */
    title: string;
  }
}

/** Every screen by its address. Each view is loaded when it is first gone to. */
export const routes: RouteRecordRaw[] = [
  // the guard sends everybody on to where the own work waits
  {
    path: '/',
    name: 'start',
    component: () => import('../views/JobsView.vue'),
    meta: { public: true, title: 'app.go.jobs' },
  },
  {
    path: '/sign-in',
    name: 'sign-in',
    component: () => import('../views/SignInView.vue'),
    meta: { public: true, title: 'account.signIn.title' },
  },
  {
    path: '/jobs',
    name: 'jobs',
    component: () => import('../views/JobsView.vue'),
    meta: { permission: 'job.list', title: 'app.go.jobs' },
  },
  {
    path: '/jobs/new',
    name: 'new-job',
    component: () => import('../views/NewJobView.vue'),
    meta: { permission: 'job.plan', title: 'app.go.newJob' },
  },
  {
    path: '/jobs/:id',
    name: 'job',
    component: () => import('../views/JobView.vue'),
    props: true,
    meta: { permission: 'job.list', title: 'app.go.job' },
  },
  {
    path: '/jobs/:id/:point',
    name: 'hold-point',
    component: () => import('../views/HoldPointView.vue'),
    props: true,
    meta: { permission: 'job.list', title: 'app.go.holdPoint' },
  },
  {
    path: '/desk',
    name: 'desk',
    component: () => import('../views/DeskView.vue'),
    meta: { permission: 'desk.read', title: 'app.go.desk' },
  },
  {
    path: '/packets',
    name: 'packets',
    component: () => import('../views/PacketsView.vue'),
    meta: { permission: 'packet.list', title: 'app.go.packets' },
  },
  {
    path: '/packets/:id',
    name: 'packet',
    component: () => import('../views/PacketView.vue'),
    props: true,
    meta: { permission: 'packet.list', title: 'app.go.packet' },
  },
  {
    path: '/account',
    name: 'account',
    component: () => import('../views/AccountView.vue'),
    meta: { permission: 'account.self', title: 'app.go.account' },
  },
  {
    path: '/:rest(.*)*',
    name: 'nowhere',
    component: () => import('../views/NowhereView.vue'),
    meta: { public: true, title: 'app.go.nowhere' },
  },
];
