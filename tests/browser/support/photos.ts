import { expect, type Page } from '@playwright/test';
import jpeg from 'jpeg-js';
import { PNG } from 'pngjs';
import { pictureOf } from '../../../server/demo/pictures/scenes';
import type { PointPlace } from '../../../shared/hold-points/points';
import { withExif } from '../../support/images/make';
import { tap } from './tap';
import { nameOf, words } from './words';

const [wide, high] = [1600, 1200];
let taken = 0;

export interface PhotoFile {
  name: string;
  mimeType: string;
  buffer: Buffer;
}

/** A photo as a phone takes it: 1600 by 1200, JPEG with its time, showing what the shot asks for; every fifth a PNG. */
export function aPhotoOf(shot: string): PhotoFile {
  taken += 1;
  const drawn = pictureOf(shot, {
    seed: taken,
    temperatureF: '290',
    pressurePsi: 1500,
    fullScalePsi: 3000,
    headSize: '11',
    ratedPsi: '3000',
  });
  if (taken % 5 === 0) return { name: `${shot}-${taken}.png`, mimeType: 'image/png', buffer: drawn };
  const buffer = withExif(Buffer.from(jpeg.encode(enlarged(drawn), 82).data), { orientation: 1 });
  return { name: `${shot}-${taken}.jpg`, mimeType: 'image/jpeg', buffer };
}

function enlarged(bytes: Buffer): { data: Buffer; width: number; height: number } {
  const { data, width, height } = PNG.sync.read(bytes);
  const large = Buffer.alloc(wide * high * 4);
  for (let y = 0; y < high; y += 1) {
    const row = Math.floor((y * height) / high) * width;
    for (let x = 0; x < wide; x += 1)
      data.copy(
        large,
        (y * wide + x) * 4,
        (row + Math.floor((x * width) / wide)) * 4,
        (row + Math.floor((x * width) / wide)) * 4 + 4,
      );
  }
  return { data: large, width: wide, height: high };
}

/** Takes the photo of a named shot by its button and waits until it is seen there. */
export async function takePhoto(page: Page, place: PointPlace, shot: string, file = aPhotoOf(shot)): Promise<void> {
  const name = nameOf(place, 'shots', shot);
  const card = page.getByRole('article').filter({ has: page.getByRole('heading', { name, exact: true }) });
  const thumbs = card.getByRole('button', { name: words('photos.thumb.open', { name }) });
  const before = await thumbs.count();
  const chooser = page.waitForEvent('filechooser');
  await tap(card.getByRole('button', { name: words('job.point.photo.take') }));
  await (await chooser).setFiles(file);
  await expect(thumbs).toHaveCount(before + 1);
}
