import { createPinia } from 'pinia';
import { createApp } from 'vue';
import App from './App.vue';
import { makeRouter } from './router';

createApp(App).use(createPinia()).use(makeRouter()).mount('#app');
