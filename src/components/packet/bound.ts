import { inject, provide, type InjectionKey } from 'vue';
import type { SignatureCheck } from '../../../shared/job/check-signatures';
import type { Signature } from '../../../shared/job/events';

type Bound = (signature: Signature) => boolean | undefined;
const key: InjectionKey<Bound> = Symbol('signatures worked out anew');

/** Lets every signature below say whether it is bound to what stands here; silent where that cannot be worked out. */
export function provideBound(checks: () => readonly SignatureCheck[] | null): void {
  provide(key, (signature) => checks()?.find((one) => one.signature === signature)?.bound);
}

export const useBound = (): Bound => inject(key, () => undefined);
