import { computed, onScopeDispose, type ComputedRef } from 'vue';
import type { Photo } from '../../../shared/job/state';
import { fileAddress } from '../../api/job';
import { useJobInHand } from '../../composables/job-in-hand';
import { useSay } from '../../composables/say';
import type { PhotoToShow } from '../photos/photo';

/** Photos as they are shown: from the outbox while their bytes lie on this device, from the server afterwards. */
export function usePhotosToShow(
  nameOf: (shot: string) => string,
): ComputedRef<(photos: readonly Photo[]) => PhotoToShow[]> {
  const hand = useJobInHand();
  const { say, instant } = useSay();
  const addresses = new Map<string, string>();

  const ofBlob = (sha256: string, bytes: Blob): string => {
    const known = addresses.get(sha256);
    if (known !== undefined) return known;
    const made = URL.createObjectURL(bytes);
    addresses.set(sha256, made);
    return made;
  };
  onScopeDispose(() => addresses.forEach((address) => URL.revokeObjectURL(address)));

  return computed(() => {
    const onDevice = new Map(
      [...hand.waiting.value, ...hand.refused.value].flatMap((entry) =>
        entry.kind === 'file' ? [[entry.body.sha256, entry.body.bytes] as const] : [],
      ),
    );
    const commands = new Set(hand.waiting.value.map((entry) => entry.id));
    const at = (sha256: string): string => {
      const bytes = onDevice.get(sha256);
      return bytes ? ofBlob(sha256, bytes) : (addresses.get(sha256) ?? fileAddress(hand.id, sha256));
    };
    return (photos) =>
      photos.map((photo) => ({
        sha256: photo.sha256,
        name: say('job.point.photo.caption', {
          label: nameOf(photo.shot),
          at: instant(photo.takenAt ?? photo.at.corrected),
        }),
        previewUrl: photo.previewSha256 === null ? null : at(photo.previewSha256),
        originalUrl: at(photo.sha256),
        width: photo.width,
        height: photo.height,
        unsent: commands.has(photo.id),
      }));
  });
}
