import { mount } from '@vue/test-utils';
import { createPinia } from 'pinia';
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { nextTick } from 'vue';
import PhotoThumb from '../../../src/components/photos/PhotoThumb.vue';
import PhotoViewer from '../../../src/components/photos/PhotoViewer.vue';
import type { PhotoToShow } from '../../../src/components/photos/photo';

const aPhoto = (n: number, change: Partial<PhotoToShow> = {}): PhotoToShow => ({
  sha256: String(n).repeat(64),
  name: `North quadrant ${n}`,
  previewUrl: `/preview-${n}.jpg`,
  originalUrl: `/original-${n}.jpg`,
  width: 4032,
  height: 3024,
  ...change,
});

let answerDecode: { resolve: () => void; reject: () => void }[];
beforeEach(() => {
  answerDecode = [];
  vi.stubGlobal(
    'Image',
    class {
      src = '';
      decode = () =>
        new Promise<void>((resolve, reject) => answerDecode.push({ resolve, reject: () => reject(new Error('gone')) }));
    },
  );
});
afterEach(() => vi.unstubAllGlobals());

const settle = async () => {
  for (let i = 0; i < 4; i += 1) await nextTick();
};

async function openViewer(photos = [aPhoto(1), aPhoto(2)]) {
  const viewer = mount(PhotoViewer, {
    props: { open: true, photos, index: 0 },
    global: { plugins: [createPinia()] },
    attachTo: document.body,
  });
  await settle();
  const press = async (key: string) => {
    await viewer.find('dialog').trigger('keydown', { key });
    await settle();
  };
  const source = () => viewer.find('img').attributes('src');
  const width = () => viewer.find('.field').attributes('style');
  return { viewer, press, source, width };
}

describe('the large view', () => {
  test('opens with the preview and asks for nothing more', async () => {
    const { source, width } = await openViewer();
    expect(source()).toBe('/preview-1.jpg');
    expect(width()).toContain('width: 100%');
    expect(answerDecode).toHaveLength(0);
  });

  test('keeps the preview until the original is decoded', async () => {
    const { press, source, width, viewer } = await openViewer();
    await press('+');
    expect(width()).toContain('width: 150%');
    expect(source()).toBe('/preview-1.jpg');
    expect(viewer.text()).toContain('The original is being opened.');
    answerDecode[0]?.resolve();
    await settle();
    expect(source()).toBe('/original-1.jpg');
  });

  test('says so when the original cannot be had, and keeps showing the preview', async () => {
    const { press, source, viewer } = await openViewer();
    await press('+');
    answerDecode[0]?.reject();
    await settle();
    expect(source()).toBe('/preview-1.jpg');
    expect(viewer.text()).toContain('The original cannot be opened now.');
  });

  test('asks for the original once, however often somebody zooms', async () => {
    const { press } = await openViewer();
    for (const key of ['+', '-', '+', '+', '0', '=']) await press(key);
    expect(answerDecode).toHaveLength(1);
  });

  test('grows to eightfold and no further, and comes back whole', async () => {
    const { press, width } = await openViewer();
    for (let i = 0; i < 9; i += 1) await press('+');
    expect(width()).toContain('width: 800%');
    await press('0');
    expect(width()).toContain('width: 100%');
  });

  test('turns to the next photo by arrow while the whole photo is seen, and not past the last', async () => {
    const { viewer, press } = await openViewer();
    await press('ArrowLeft');
    await press('ArrowRight');
    expect(viewer.emitted('update:index')).toEqual([[1]]);
    await press('+');
    await press('ArrowRight');
    expect(viewer.emitted('update:index')).toHaveLength(1);
  });

  test('starts whole and with the preview at another photo', async () => {
    const { viewer, press, source, width } = await openViewer();
    await press('+');
    answerDecode[0]?.resolve();
    await settle();
    await viewer.setProps({ index: 1 });
    await settle();
    expect(source()).toBe('/preview-2.jpg');
    expect(width()).toContain('width: 100%');
  });

  test('opens the original at once where there is no preview', async () => {
    const { source } = await openViewer([aPhoto(1, { previewUrl: null })]);
    answerDecode[0]?.resolve();
    await settle();
    expect(source()).toBe('/original-1.jpg');
  });

  test('says in words when there is nothing to show', async () => {
    const { viewer } = await openViewer([aPhoto(1, { previewUrl: null, originalUrl: null })]);
    expect(viewer.find('img').exists()).toBe(false);
    expect(viewer.text()).toContain('This photo cannot be shown here.');
  });
});

describe('a photo in a row', () => {
  test('opens large by its hash and says what is not sent', async () => {
    const thumb = mount(PhotoThumb, {
      props: { photo: aPhoto(3, { unsent: true }) },
      global: { plugins: [createPinia()] },
    });
    expect(thumb.attributes('aria-label')).toBe('Show large: North quadrant 3. Not yet sent');
    await thumb.trigger('click');
    expect(thumb.emitted('open')).toEqual([['3'.repeat(64)]]);
  });

  test('stands with words where there is neither a preview nor the original', () => {
    const thumb = mount(PhotoThumb, {
      props: { photo: aPhoto(3, { previewUrl: null, originalUrl: null }) },
      global: { plugins: [createPinia()] },
    });
    expect(thumb.text()).toContain('No preview');
  });
});
