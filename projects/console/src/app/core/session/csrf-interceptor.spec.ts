import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { provideZonelessChangeDetection } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { csrfInterceptor } from './csrf-interceptor';
import { Session } from './session';

const header = 'X-CSRF-Token';

async function signedIn() {
  TestBed.configureTestingModule({
    providers: [
      provideZonelessChangeDetection(),
      provideHttpClient(withInterceptors([csrfInterceptor])),
      provideHttpClientTesting(),
    ],
  });
  const backend = TestBed.inject(HttpTestingController);
  const loaded = TestBed.inject(Session).load();
  backend.expectOne('/v1/session').flush({ person: null, permissions: [], csrfToken: 'tok' });
  await loaded;
  return { http: TestBed.inject(HttpClient), backend };
}

describe('the token against forged requests', () => {
  it.each(['POST', 'PATCH', 'DELETE'])('goes with every %s to the service', async (method) => {
    const { http, backend } = await signedIn();
    http.request(method, '/v1/clients').subscribe();
    expect(backend.expectOne('/v1/clients').request.headers.get(header)).toBe('tok');
  });

  it('does not go with what only reads', async () => {
    const { http, backend } = await signedIn();
    http.get('/v1/clients').subscribe();
    expect(backend.expectOne('/v1/clients').request.headers.has(header)).toBe(false);
  });

  it.each(['https://other.example/v1/clients', '//other.example/v1/clients', '/problems'])(
    'never goes to %s',
    async (url) => {
      const { http, backend } = await signedIn();
      http.post(url, {}).subscribe();
      expect(backend.expectOne(url).request.headers.has(header)).toBe(false);
    },
  );
});
