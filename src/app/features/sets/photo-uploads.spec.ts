import { HttpEventType, provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, type TestRequest } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import type { Photo } from '../../../contracts/sets';
import { PhotoUploads } from './photo-uploads';

const PHOTO: Photo = {
  id: 31,
  caption: '',
  position: 0,
  width: 800,
  height: 600,
  large: '/api/photos/31/large',
  small: '/api/photos/31/small',
};
const ADDRESS = '/api/sets/7/photos';

let uploads: PhotoUploads;
let http: HttpTestingController;
const rows = () => uploads.rows().map(({ name, percent, problem }) => ({ name, percent, problem }));
const file = (name: string) => new File(['picture'], name, { type: 'image/jpeg' });
const refuse = (request: TestRequest) =>
  request.flush(
    { type: '/problems/unusable-photo', title: 'Not a photograph', status: 422, detail: 'It is a text file.' },
    { status: 422, statusText: 'Refused' },
  );

beforeEach(() => {
  TestBed.configureTestingModule({ providers: [PhotoUploads, provideHttpClient(), provideHttpClientTesting()] });
  uploads = TestBed.inject(PhotoUploads);
  http = TestBed.inject(HttpTestingController);
});

it('shows how much of a file is sent, then hands over the photograph', () => {
  const added: Photo[] = [];
  uploads.added.subscribe((photo) => added.push(photo));
  uploads.add(7, [file('front.jpg')]);
  const request = http.expectOne(ADDRESS);
  expect((request.request.body as FormData).get('photo')).toMatchObject({ name: 'front.jpg' });
  request.event({ type: HttpEventType.UploadProgress, loaded: 30, total: 120 });
  expect(rows()).toEqual([{ name: 'front.jpg', percent: 25, problem: null }]);
  request.flush(PHOTO);
  expect(added).toEqual([PHOTO]);
  expect(rows()).toEqual([]);
});

it('sends several files one after the other; one refused does not stop the next', () => {
  uploads.add(7, [file('letter.jpg'), file('back.jpg')]);
  refuse(http.expectOne(ADDRESS));
  expect(rows()).toEqual([
    { name: 'letter.jpg', percent: 0, problem: 'It is a text file.' },
    { name: 'back.jpg', percent: 0, problem: null },
  ]);
  http.expectOne(ADDRESS).flush(PHOTO);
  expect(rows()).toEqual([{ name: 'letter.jpg', percent: 0, problem: 'It is a text file.' }]);
});

it('sends a refused file again when asked', () => {
  uploads.add(7, [file('front.jpg')]);
  http.expectOne(ADDRESS).error(new ProgressEvent('error'));
  expect(uploads.rows()[0]?.problem).toContain('The server does not answer');
  uploads.retry(7, uploads.rows()[0]!.id);
  expect(rows()).toEqual([{ name: 'front.jpg', percent: 0, problem: null }]);
  http.expectOne(ADDRESS).flush(PHOTO);
  expect(rows()).toEqual([]);
});

it('does not send a file over the limit', () => {
  const large = file('scan.tif');
  Object.defineProperty(large, 'size', { value: 25 * 1024 * 1024 + 1 });
  uploads.add(7, [large]);
  http.expectNone(ADDRESS);
  expect(uploads.rows()[0]?.problem).toContain('25 MB');
});

it('stops a file that is dropped, and leaves out one that still waits', () => {
  uploads.add(7, [file('a.jpg'), file('b.jpg'), file('c.jpg')]);
  const [first, second] = uploads.rows();
  const request = http.expectOne(ADDRESS);
  uploads.drop(second!.id);
  uploads.drop(first!.id);
  expect(request.cancelled).toBe(true);
  expect((http.expectOne(ADDRESS).request.body as FormData).get('photo')).toMatchObject({ name: 'c.jpg' });
});
