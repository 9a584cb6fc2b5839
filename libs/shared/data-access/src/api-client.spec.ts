import { HttpEventType, provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, type TestRequest } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { firstValueFrom, of, Subject, throwError, type Observable } from 'rxjs';
import * as z from 'zod';
import { anyone, defineEndpoint, pageQuery, staffOnly, type Problem } from '@seamwright/shared/contracts';
import { ACCESS_TOKEN_SOURCE } from './access-token';
import { ApiClient, type UploadStep } from './api-client';
import { ApiProblem } from './api-problem';

const access = staffOnly('rep');
const joint = z.strictObject({ name: z.string() });
const params = { jointId: z.string() };
const getJoint = defineEndpoint({
  id: 'joints.get',
  summary: '',
  method: 'GET',
  path: '/joints/:jointId',
  access,
  params,
  query: { ...pageQuery, species: z.array(z.string()).optional(), boned: z.boolean().optional() },
  response: joint,
});
const addJoint = defineEndpoint({
  id: 'joints.add',
  summary: '',
  method: 'POST',
  path: '/joints',
  access,
  body: joint,
  response: joint,
  status: 201,
  idempotent: true,
});
const renameJoint = defineEndpoint({
  id: 'joints.rename',
  summary: '',
  method: 'PUT',
  path: '/joints/:jointId',
  access,
  params,
  body: joint,
  response: joint,
  guarded: true,
});
const drawJoint = defineEndpoint({
  id: 'joints.paper',
  summary: '',
  method: 'GET',
  path: '/joints/paper',
  access,
  file: 'application/pdf',
});
const loadJoints = defineEndpoint({
  id: 'joints.load',
  summary: '',
  method: 'POST',
  path: '/joints/load',
  access,
  body: z.strictObject({ how: z.string() }),
  response: joint,
  upload: { maxBytes: 1_000 },
});
const signIn = defineEndpoint({ id: 'door', summary: '', method: 'POST', path: '/door', access: anyone });

// The test's browser can't read a blob this way.
beforeAll(() => {
  Blob.prototype.text ??= function text(this: Blob) {
    return new Promise((resolve, reject) => {
      const reader = new FileReader();
      reader.onload = () => resolve(String(reader.result));
      reader.onerror = () => reject(reader.error ?? new Error('The blob could not be read'));
      reader.readAsText(this);
    });
  };
});

let http: HttpTestingController;
let api: ApiClient;
let token: string | null;
let renewals: number;
let renew: () => Observable<string | null>;

beforeEach(() => {
  token = 'old';
  renewals = 0;
  renew = () => of((token = 'new'));
  const tokens = { current: () => token, renew: () => (renewals++, renew()) };
  TestBed.configureTestingModule({
    providers: [provideHttpClient(), provideHttpClientTesting(), { provide: ACCESS_TOKEN_SOURCE, useValue: tokens }],
  });
  http = TestBed.inject(HttpTestingController);
  api = TestBed.inject(ApiClient);
});
afterEach(() => http.verify());

const sent = (): TestRequest => http.expectOne(() => true);
const header = ({ request }: TestRequest, name: string): string | null => request.headers.get(name);
const refused: Problem = {
  type: '/problems/stale',
  title: 'Precondition Failed',
  status: 412,
  detail: 'Somebody changed this.',
  instance: '/api/v1/joints/7',
  code: 'stale',
  errors: [{ pointer: '/name', message: 'Too long.' }],
};
const expired = { status: 401, statusText: 'Unauthorized' };

/** What an observable comes to: its values, and the problem that it ended with. */
function followed<T>(observable: Observable<T>): { readonly values: T[]; problem: Problem | null } {
  const seen: { values: T[]; problem: Problem | null } = { values: [], problem: null };
  observable.subscribe({
    next: (value) => seen.values.push(value),
    error: (error: unknown) => {
      expect(error).toBeInstanceOf(ApiProblem);
      seen.problem = (error as ApiProblem).problem;
    },
  });
  return seen;
}

describe('a call', () => {
  it('goes to the declared address, with lists and without what was left out', () => {
    const query = { species: ['lamb', 'beef & veal'], boned: false, cursor: undefined, limit: 20 };
    const seen = followed(api.call(getJoint, { params: { jointId: 'a/b c' }, query }));
    const call = sent();
    expect(call.request.method).toBe('GET');
    expect(call.request.urlWithParams).toBe(
      '/api/v1/joints/a%2Fb%20c?species=lamb&species=beef%20%26%20veal&boned=false&limit=20',
    );
    call.flush({ name: 'Saddle' });
    expect(seen.values).toEqual([{ name: 'Saddle' }]);
  });

  it('carries the token in force, and none when nobody is signed in', () => {
    followed(api.call(signIn, {}));
    expect(header(sent(), 'authorization')).toBe('Bearer old');
    token = null;
    followed(api.call(signIn, {}));
    expect(http.match(() => true).map((call) => call.request.headers.has('authorization'))).toEqual([false]);
  });

  it('says which version it edits, and is not keyed', () => {
    followed(api.call(renameJoint, { params: { jointId: '7' }, body: { name: 'Loin' }, ifMatch: 3 }));
    const call = sent();
    expect(header(call, 'if-match')).toBe('"3"');
    expect(header(call, 'idempotency-key')).toBeNull();
    expect(call.request.body).toEqual({ name: 'Loin' });
  });

  it('is keyed when it creates: by the deed’s own key, or by a fresh one for each', () => {
    const body = { name: 'Loin' };
    followed(api.call(addJoint, { body, idempotencyKey: 'my-deed' }));
    followed(api.call(addJoint, { body }));
    followed(api.call(addJoint, { body }));
    const keys = http.match(() => true).map((call) => header(call, 'idempotency-key'));
    expect(keys[0]).toBe('my-deed');
    expect(keys.every((key) => key !== null && key.length > 0)).toBe(true);
    expect(new Set(keys).size).toBe(3);
  });
});

describe('a call whose token was refused', () => {
  it('is sent once more under a renewed one, as the same deed', () => {
    const seen = followed(api.call(addJoint, { body: { name: 'Loin' } }));
    const first = sent();
    first.flush(null, expired);
    const again = sent();
    expect(header(again, 'authorization')).toBe('Bearer new');
    expect(header(again, 'idempotency-key')).toBe(header(first, 'idempotency-key'));
    expect(again.request.body).toEqual({ name: 'Loin' });
    again.flush({ name: 'Loin' });
    expect(seen).toEqual({ values: [{ name: 'Loin' }], problem: null });
    expect(renewals).toBe(1);
  });

  it('is not sent a third time', () => {
    const seen = followed(api.call(addJoint, { body: { name: 'Loin' } }));
    sent().flush(null, expired);
    sent().flush(null, expired);
    http.expectNone(() => true);
    expect(seen.problem?.status).toBe(401);
    expect(renewals).toBe(1);
  });

  it('is refused when the sign-in has ended', () => {
    renew = () => of(null);
    const seen = followed(api.call(getJoint, { params: { jointId: '7' } }));
    sent().flush(null, expired);
    expect(seen.problem?.status).toBe(401);
  });

  it('tells why the token could not be renewed', () => {
    const offline = new ApiProblem({ ...refused, status: 0, code: 'offline' });
    renew = () => throwError(() => offline);
    const seen = followed(api.call(getJoint, { params: { jointId: '7' } }));
    sent().flush(null, expired);
    expect(seen.problem).toEqual(offline.problem);
  });

  it('is not renewed where no sign-in is asked for: a wrong password is one', () => {
    const seen = followed(api.call(signIn, {}));
    sent().flush({ ...refused, status: 401, code: 'sign-in-refused' }, expired);
    expect(seen.problem?.code).toBe('sign-in-refused');
    expect(renewals).toBe(0);
  });
});

describe('a call that fails', () => {
  const ask = () => followed(api.call(getJoint, { params: { jointId: '7' } }));

  it('is the problem that the server told', () => {
    const seen = ask();
    sent().flush(refused, { status: 412, statusText: 'Precondition Failed' });
    expect(seen.problem).toEqual(refused);
  });

  it('is told as no connection when the server was not reached', () => {
    const seen = ask();
    sent().error(new ProgressEvent('error'));
    expect(seen.problem).toMatchObject({ status: 0, code: 'offline', title: 'No connection' });
    expect(seen.problem?.detail).toContain('What you typed is kept');
  });

  it.each([
    ['a page of a proxy', '<html>Bad gateway</html>'],
    ['nothing', null],
    ['JSON of another shape', { message: 'boom' }],
  ])('is told in our own words when the answer is %s', (_, body) => {
    const seen = ask();
    sent().flush(body, { status: 502, statusText: 'Bad Gateway' });
    expect(seen.problem).toMatchObject({ status: 502, code: 'unexpected', errors: [] });
    expect(seen.problem?.detail).toContain('went wrong on our side');
  });
});

describe('a download', () => {
  const ask = () => firstValueFrom(api.download(drawJoint, {}));
  const paper = new Blob(['%PDF'], { type: 'application/pdf' });

  it('comes with its name', async () => {
    const asked = ask();
    const call = sent();
    expect(call.request.responseType).toBe('blob');
    const headers = { 'content-disposition': "attachment; filename*=UTF-8''Rechnung%20%C2%A3%207.pdf" };
    call.flush(paper, { headers });
    expect(await asked).toEqual({ fileName: 'Rechnung £ 7.pdf', blob: paper });
  });

  it('has a name even when the server told none', async () => {
    const asked = ask();
    sent().flush(paper);
    expect((await asked).fileName).toBe('download');
  });

  it('that is refused tells the problem behind the blob', async () => {
    const asked = ask();
    const body = new Blob([JSON.stringify(refused)], { type: 'application/problem+json' });
    sent().flush(body, { status: 412, statusText: 'Precondition Failed' });
    await expect(asked).rejects.toMatchObject({ name: 'ApiProblem', problem: refused });
  });

  it('that fails otherwise is told in our own words', async () => {
    const asked = ask();
    sent().flush(new Blob(['<html>']), { status: 500, statusText: 'Internal Server Error' });
    await expect(asked).rejects.toMatchObject({ problem: { status: 500, code: 'unexpected' } });
  });

  it('that fails and can’t be read is told in our own words, too', async () => {
    const asked = ask();
    const body = Object.assign(new Blob(['x']), { text: () => Promise.reject(new Error('The connection broke')) });
    sent().flush(body, { status: 500, statusText: 'Internal Server Error' });
    await expect(asked).rejects.toMatchObject({ problem: { status: 500, code: 'unexpected' } });
  });

  it('is asked for again under a renewed token', async () => {
    const asked = ask();
    sent().flush(new Blob(['{}']), expired);
    sent().flush(paper);
    expect((await asked).blob).toBe(paper);
  });
});

describe('an upload', () => {
  const file = new File(['rows'], 'orders.xlsx');
  const start = () => followed<UploadStep<typeof loadJoints>>(api.upload(loadJoints, { body: { how: 'all' }, file }));
  const tell = (call: TestRequest, loaded: number, total?: number) =>
    call.event({ type: HttpEventType.UploadProgress, loaded, ...(total === undefined ? {} : { total }) });

  it('tells how far it is, then the answer', () => {
    const seen = start();
    const call = sent();
    const form = call.request.body as FormData;
    expect([form.get('how'), (form.get('file') as File).name]).toEqual(['all', 'orders.xlsx']);
    tell(call, 1, 3);
    tell(call, 2, 3);
    tell(call, 2, 3);
    tell(call, 3, 3);
    call.flush({ name: 'Loin' });
    expect(seen.values).toEqual([
      { percent: 33, answer: null },
      { percent: 66, answer: null },
      { percent: 100, answer: null },
      { percent: 100, answer: { name: 'Loin' } },
    ]);
  });

  it('says nothing of how far it is when its length is not known', () => {
    const seen = start();
    const call = sent();
    tell(call, 5);
    call.flush({ name: 'Loin' });
    expect(seen.values).toEqual([{ percent: 100, answer: { name: 'Loin' } }]);
  });

  it('never goes back when it is sent anew under a renewed token', () => {
    const seen = start();
    const first = sent();
    tell(first, 4, 5);
    first.flush(null, expired);
    const again = sent();
    tell(again, 1, 5);
    tell(again, 5, 5);
    again.flush({ name: 'Loin' });
    expect(seen.values.map(({ percent }) => percent)).toEqual([80, 100, 100]);
  });

  it('that is refused is a problem', () => {
    const seen = start();
    const call = sent();
    tell(call, 1, 2);
    call.flush(refused, { status: 412, statusText: 'Precondition Failed' });
    expect(seen).toEqual({ values: [{ percent: 50, answer: null }], problem: refused });
  });

  it('is given up when nobody waits for it any more', () => {
    const uploading = api.upload(loadJoints, { body: { how: 'all' }, file }).subscribe();
    const call = sent();
    uploading.unsubscribe();
    expect(call.cancelled).toBe(true);
  });
});

describe('calls while a renewal is under way', () => {
  it('wait for it', () => {
    const renewed = new Subject<string | null>();
    renew = () => renewed;
    const seen = followed(api.call(getJoint, { params: { jointId: '7' } }));
    sent().flush(null, expired);
    http.expectNone(() => true);
    renewed.next('newer');
    const again = sent();
    expect(header(again, 'authorization')).toBe('Bearer newer');
    again.flush({ name: 'Saddle' });
    expect(seen.values).toEqual([{ name: 'Saddle' }]);
  });
});
