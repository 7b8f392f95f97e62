import { createI18n } from 'vue-i18n';
import en from '../shared/locales/en';

/** The messages and the language in force. Sentences are said by `useSay`, with values printed the reader's way. */
export const i18n = createI18n({
  legacy: false,
  locale: 'en',
  fallbackLocale: 'en',
  messages: { en },
});
