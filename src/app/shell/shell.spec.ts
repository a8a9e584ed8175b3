import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { MatMenuHarness } from '@angular/material/menu/testing';
import { provideRouter, Router } from '@angular/router';
import { problems } from '../server/problems';
import { Reachability } from '../server/reachability';
import { sampleSession } from '../session/sample-session';
import { Shell } from './shell';

describe('Shell', () => {
  let backend: HttpTestingController;
  let fixture: ComponentFixture<Shell>;

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problems])),
        provideHttpClientTesting(),
        provideRouter([{ path: '**', children: [] }]),
      ],
    });
    backend = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(Shell);
  });

  const text = (): string => (fixture.nativeElement as HTMLElement).textContent ?? '';
  const answer = async (roles: ['designer'] | null): Promise<void> => {
    await fixture.whenStable();
    backend.expectOne('/api/session').flush(sampleSession(roles));
    await settle();
  };
  const settle = async (): Promise<void> => {
    await new Promise((resolve) => setTimeout(resolve));
    await fixture.whenStable();
  };

  it('shows who is signed in to which shop, and only what exists', async () => {
    await answer(['designer']);
    expect(text()).toContain('Wren Adler');
    expect(text()).toContain('Test shop · demo shop');
    expect([...(fixture.nativeElement as HTMLElement).querySelectorAll('nav a')].map((a) => a.textContent)).toEqual([
      'Parts',
    ]);
  });

  it('offers the themes and signs out', async () => {
    await answer(['designer']);
    const menu = await TestbedHarnessEnvironment.loader(fixture).getHarness(MatMenuHarness);
    await menu.open();
    const items = await menu.getItems();
    expect(await Promise.all(items.map((item) => item.getText()))).toEqual([
      'As the system',
      'Light',
      'Dark',
      'Sign out',
    ]);
    await items[3]!.click();
    backend.expectOne({ method: 'DELETE', url: '/api/session' }).flush(sampleSession(null));
    await settle();
    expect(TestBed.inject(Router).url).toBe('/sign-in');
  });

  it('says that the server is lost instead of a page, and goes on when it is back', async () => {
    await fixture.whenStable();
    backend.expectOne('/api/session').error(new ProgressEvent('error'));
    await settle();
    expect(text()).toContain('You are not signed out');
    (fixture.nativeElement as HTMLElement).querySelector<HTMLElement>('lw-lost-server button')?.click();
    await answer(['designer']);
    expect(text()).toContain('Wren Adler');
    expect((fixture.nativeElement as HTMLElement).querySelector('lw-lost-server')).toBeNull();
  });

  it('shows a quiet bar during an outage and leaves the page as it is', async () => {
    await answer(['designer']);
    TestBed.inject(Reachability).lost();
    await fixture.whenStable();
    expect(text()).toContain('Nothing on this page is lost');
    expect(text()).toContain('Wren Adler');
    (fixture.nativeElement as HTMLElement).querySelector<HTMLElement>('lw-outage-bar button')?.click();
    backend.expectOne('/api/session').flush(sampleSession(null));
    await settle();
    expect(text()).not.toContain('Nothing on this page is lost');
    expect(text()).toContain('Wren Adler');
  });

  it('leads the keyboard past the bar', async () => {
    await answer(['designer']);
    const skip = (fixture.nativeElement as HTMLElement).querySelector<HTMLElement>('.skip');
    document.body.append(fixture.nativeElement as HTMLElement);
    skip?.click();
    expect(document.activeElement?.id).toBe('content');
  });
});
