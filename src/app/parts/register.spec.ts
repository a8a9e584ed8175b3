import { BreakpointObserver } from '@angular/cdk/layout';
import type { HarnessLoader } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, type TestRequest } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { MatSelectHarness } from '@angular/material/select/testing';
import { MatSortHarness } from '@angular/material/sort/testing';
import { MatTableHarness } from '@angular/material/table/testing';
import { By } from '@angular/platform-browser';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { Role } from '@shared/contracts/session';
import { of } from 'rxjs';
import { problems } from '../server/problems';
import { Reachability } from '../server/reachability';
import { SessionStore } from '../session/session-store';
import { PartsList } from './parts-list';
import { Register } from './register';
import { sampleList, sampleRow } from './sample-rows';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class PartPage {}

describe('Register', () => {
  let backend: HttpTestingController;
  let page: RouterTestingHarness;
  let loader: HarnessLoader;
  let roles: Role[];
  let narrow: boolean;

  beforeEach(() => {
    roles = ['designer'];
    narrow = false;
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problems])),
        provideHttpClientTesting(),
        provideRouter(
          [
            { path: 'parts', component: Register },
            { path: 'parts/:id', component: PartPage },
          ],
          withComponentInputBinding(),
        ),
        { provide: SessionStore, useValue: { hasRole: (role: Role) => roles.includes(role) } },
        { provide: BreakpointObserver, useValue: { observe: () => of({ matches: narrow }) } },
      ],
    });
    backend = TestBed.inject(HttpTestingController);
  });

  afterEach(() => backend.verify());

  const open = async (address = '/parts'): Promise<TestRequest> => {
    page = await RouterTestingHarness.create(address);
    loader = TestbedHarnessEnvironment.loader(page.fixture);
    return backend.expectOne((request) => request.url === '/api/parts');
  };
  const asked = (): TestRequest => backend.expectOne((request) => request.url === '/api/parts');
  const settle = async (): Promise<void> => {
    await new Promise((resolve) => setTimeout(resolve));
    await page.fixture.whenStable();
  };
  const element = (): HTMLElement => page.fixture.nativeElement as HTMLElement;
  const params = (request: TestRequest): Record<string, string | null> =>
    Object.fromEntries(request.request.params.keys().map((key) => [key, request.request.params.get(key)]));

  it('lists parts with a link, sizes and who changed them', async () => {
    (await open()).flush(sampleList([sampleRow('1'), sampleRow('2', { stops: 2, material: null })]));
    await settle();
    const rows = await (await loader.getHarness(MatTableHarness)).getCellTextByColumnName();
    expect(rows['number']?.text).toEqual(['LW-1', 'LW-2']);
    expect(rows['blank']?.text).toEqual(['3.758 × 6.000 in', '3.758 × 6.000 in']);
    expect(rows['revision']?.text[1]).toContain('2 stops');
    expect(rows['material']?.text[1]).toContain('—');
    expect(element().querySelector('td a')?.getAttribute('href')).toBe('/parts/1');
    expect(element().textContent).toContain('2 parts');
  });

  it('asks for what stands in the address', async () => {
    const request = await open('/parts?search=hat&material=2024-T3&unit=mm&sort=number');
    expect(params(request)).toEqual({ search: 'hat', material: '2024-T3', unit: 'mm', sort: 'number' });
    request.flush(sampleList([sampleRow('1')]));
    await settle();
    const box = await loader.getHarness(MatInputHarness);
    expect(await box.getValue()).toBe('hat');
  });

  it('takes no order and no unit that does not exist', async () => {
    const request = await open('/parts?unit=ell&sort=price');
    expect(params(request)).toEqual({ sort: '-changed' });
    request.flush(sampleList([]));
  });

  it('searches as you type, once typing pauses, and puts the search into the address', async () => {
    (await open()).flush(sampleList([sampleRow('1')]));
    await settle();
    jasmine.clock().install().mockDate();
    try {
      const box = element().querySelector<HTMLInputElement>('input[type=search]')!;
      for (const text of ['h', 'ha', 'hat ']) {
        box.value = text;
        box.dispatchEvent(new Event('input'));
        jasmine.clock().tick(200);
      }
      backend.expectNone((request) => request.url === '/api/parts');
      jasmine.clock().tick(50);
    } finally {
      jasmine.clock().uninstall();
    }
    await settle();
    await settle();
    expect(TestBed.inject(Router).url).toBe('/parts?search=hat');
    asked().flush(sampleList([sampleRow('1')]));
    await settle();
    expect(element().querySelector<HTMLInputElement>('input[type=search]')?.value).toBe('hat ');
  });

  it('searches again for the same after the search was taken out of the address', async () => {
    (await open('/parts?search=hat')).flush(sampleList([sampleRow('1')]));
    await settle();
    const search = async (text: string): Promise<void> => {
      jasmine.clock().install().mockDate();
      try {
        const box = element().querySelector<HTMLInputElement>('input[type=search]')!;
        box.value = text;
        box.dispatchEvent(new Event('input'));
        jasmine.clock().tick(300);
      } finally {
        jasmine.clock().uninstall();
      }
      await settle();
      await settle();
    };
    await search('z');
    asked().flush(sampleList([]));
    await TestBed.inject(Router).navigateByUrl('/parts');
    await settle();
    asked().flush(sampleList([sampleRow('1')]));
    await settle();
    await search('z');
    expect(TestBed.inject(Router).url).toBe('/parts?search=z');
    asked().flush(sampleList([]));
  });

  it('asks for nothing when the box says what the address says already', async () => {
    (await open('/parts?search=hat')).flush(sampleList([sampleRow('1')]));
    await settle();
    const navigate = spyOn(TestBed.inject(Router), 'navigate').and.callThrough();
    jasmine.clock().install().mockDate();
    try {
      const box = element().querySelector<HTMLInputElement>('input[type=search]')!;
      for (const text of ['hats', 'hat']) {
        box.value = text;
        box.dispatchEvent(new Event('input'));
      }
      jasmine.clock().tick(300);
    } finally {
      jasmine.clock().uninstall();
    }
    expect(navigate).not.toHaveBeenCalled();
  });

  it('never reads on in a list that another search has replaced', async () => {
    (await open()).flush(sampleList([sampleRow('1')], { next: 'after-1', total: 2 }));
    await settle();
    await TestBed.inject(Router).navigateByUrl('/parts?search=hat');
    await settle();
    backend.match((request) => request.params.has('after'));
    const searched = asked();
    page.fixture.debugElement.query(By.directive(Register)).injector.get(PartsList).more();
    backend.expectNone((request) => request.params.has('after'));
    searched.flush(sampleList([sampleRow('2')]));
    await settle();
    expect(element().querySelectorAll('tr[mat-row]')).toHaveSize(1);
  });

  it('filters and sorts by way of the address', async () => {
    (await open()).flush(sampleList([sampleRow('1')]));
    await settle();
    const [material] = await loader.getAllHarnesses(MatSelectHarness);
    await material!.clickOptions({ text: '5052-H32' });
    await settle();
    expect(TestBed.inject(Router).url).toBe('/parts?material=5052-H32');
    asked().flush(sampleList([sampleRow('1')]));
    await settle();
    const [number] = await (await loader.getHarness(MatSortHarness)).getSortHeaders({ label: 'Number' });
    await number!.click();
    await settle();
    expect(params(asked())).toEqual({ material: '5052-H32', sort: 'number' });
  });

  it('reads on from where the list ended', async () => {
    (await open()).flush(sampleList([sampleRow('1')], { next: 'after-1', total: 2 }));
    await settle();
    await (await loader.getHarness(MatButtonHarness.with({ text: /more/ }))).click();
    const more = backend.expectOne((request) => request.params.get('after') === 'after-1');
    more.flush(sampleList([sampleRow('2')], { total: 2 }));
    await settle();
    expect(await (await loader.getHarness(MatTableHarness)).getRows()).toHaveSize(2);
    expect(element().textContent).not.toContain('Show more');
  });

  it('shows an empty shop what to do', async () => {
    (await open()).flush(sampleList([]));
    await settle();
    expect(element().textContent).toContain('No parts yet');
    expect(element().querySelector('.state a')?.getAttribute('href')).toBe('/parts/new');
  });

  it('clears search and filters when nothing is found', async () => {
    (await open('/parts?search=zzz&unit=mm')).flush(sampleList([]));
    await settle();
    expect(element().textContent).toContain('No part matches');
    await (await loader.getHarness(MatButtonHarness.with({ text: 'Show all parts' }))).click();
    await settle();
    expect(TestBed.inject(Router).url).toBe('/parts');
    asked().flush(sampleList([sampleRow('1')]));
    await settle();
    expect(element().querySelectorAll('tr[mat-row]')).toHaveSize(1);
  });

  it('says that it could not be read, and tries again', async () => {
    (await open()).error(new ProgressEvent('error'));
    await settle();
    expect(element().textContent).toContain("can't be reached");
    await (await loader.getHarness(MatButtonHarness.with({ text: 'Try again' }))).click();
    await settle();
    asked().flush(sampleList([sampleRow('1')]));
    await settle();
    expect(element().querySelectorAll('tr[mat-row]')).toHaveSize(1);
  });

  it('reads by itself as soon as the server answers again', async () => {
    (await open()).error(new ProgressEvent('error'));
    await settle();
    TestBed.inject(Reachability).answered();
    await settle();
    asked().flush(sampleList([sampleRow('1')]));
    await settle();
    expect(element().querySelectorAll('tr[mat-row]')).toHaveSize(1);
  });

  it('tells people without the role why they make no parts', async () => {
    roles = ['technician'];
    (await open()).flush(sampleList([sampleRow('1')]));
    await settle();
    const button = await loader.getHarness(MatButtonHarness.with({ text: 'New part' }));
    expect(await button.isDisabled()).toBeTrue();
    const described = await (await button.host()).getAttribute('aria-describedby');
    expect(document.getElementById(described ?? '')?.textContent).toContain('Only designers');
  });

  it('is a list on a phone, with the order as a choice', async () => {
    narrow = true;
    (await open()).flush(sampleList([sampleRow('1')]));
    await settle();
    expect(element().querySelector('table')).toBeNull();
    expect(element().querySelector('li a')?.getAttribute('href')).toBe('/parts/1');
    expect(element().textContent).toContain('Changed, newest first');
  });
});
