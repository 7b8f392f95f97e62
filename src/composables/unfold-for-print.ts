import { onMounted, onScopeDispose } from 'vue';

/** Paper cannot be unfolded: while the page is printed everything folded stands open, and folds again afterwards. */
export function useUnfoldForPrint(): void {
  let folded: HTMLDetailsElement[] = [];

  function unfold(): void {
    folded = [...document.querySelectorAll<HTMLDetailsElement>('details:not([open])')];
    for (const one of folded) one.open = true;
  }
  function fold(): void {
    for (const one of folded) one.open = false;
    folded = [];
  }

  onMounted(() => {
    addEventListener('beforeprint', unfold);
    addEventListener('afterprint', fold);
  });
  onScopeDispose(() => {
    removeEventListener('beforeprint', unfold);
    removeEventListener('afterprint', fold);
  });
}
