import type { HarnessLoader } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatButtonToggleHarness } from '@angular/material/button-toggle/testing';
import { MatFormFieldHarness } from '@angular/material/form-field/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { provideRouter, Router } from '@angular/router';
import type { CreatePart, Part } from '@shared/contracts/parts';
import type { Role } from '@shared/contracts/session';
import { PROBLEM } from '@shared/contracts/problem-types';
import { problems } from '../server/problems';
import { sampleList, sampleRow } from '../parts/sample-rows';
import { SessionStore } from '../session/session-store';
import { NewPartPage } from './new-part-page';

describe('NewPartPage', () => {
  let backend: HttpTestingController;
  let fixture: ComponentFixture<NewPartPage>;
  let loader: HarnessLoader;
  let roles: Role[];

  beforeEach(() => {
    sessionStorage.clear();
    roles = ['designer'];
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problems])),
        provideHttpClientTesting(),
        provideRouter([{ path: 'parts/:id', children: [] }]),
        {
          provide: SessionStore,
          useValue: { hasRole: (role: Role) => roles.includes(role), person: () => ({ name: 'Avery Example' }) },
        },
      ],
    });
    backend = TestBed.inject(HttpTestingController);
  });

  afterEach(() => {
    backend.verify();
    sessionStorage.clear();
  });

  const open = async (): Promise<void> => {
    fixture = TestBed.createComponent(NewPartPage);
    loader = TestbedHarnessEnvironment.loader(fixture);
    await fixture.whenStable();
  };
  const field = (label: string): Promise<MatFormFieldHarness> =>
    loader.getHarness(MatFormFieldHarness.with({ floatingLabelText: label }));
  const type = async (label: string, text: string): Promise<void> => {
    const input = await (await field(label)).getControl(MatInputHarness);
    await input!.setValue(text);
  };
  const valueOf = async (label: string): Promise<string> =>
    (await (await field(label)).getControl(MatInputHarness))!.getValue();
  const toggle = async (text: string): Promise<void> =>
    (await loader.getHarness(MatButtonToggleHarness.with({ text }))).check();
  const make = async (): Promise<void> =>
    (await loader.getHarness(MatButtonHarness.with({ text: 'Make the part' }))).click();
  const element = (): HTMLElement => fixture.nativeElement as HTMLElement;
  const settle = async (): Promise<void> => {
    await new Promise((resolve) => setTimeout(resolve));
    await fixture.whenStable();
  };

  it('draws the section while it is typed', async () => {
    await open();
    expect(element().querySelector('lw-live-section')?.textContent).toContain('3.758');
    await type('Overall width', '3');
    expect(element().querySelector('lw-live-section')?.textContent).toContain('4.758');
  });

  it('marks what is broken, keeps the last good drawing and says that it is not current', async () => {
    await open();
    await type('Thickness', 'thin');
    expect(await (await field('Thickness')).hasErrors()).toBeTrue();
    const live = element().querySelector('lw-live-section');
    expect(live?.textContent).toContain('Not current');
    expect(live?.querySelector('path')).not.toBeNull();
    await make();
    backend.expectNone('/api/parts');
    expect(await valueOf('Thickness')).toBe('thin');
  });

  it('asks for number and title before anything is sent', async () => {
    await open();
    await make();
    expect(await (await field('Part number')).getTextErrors()).toEqual(['Give the part a number.']);
    expect(await (await field('Title')).getTextErrors()).toEqual(['Give the part a title.']);
  });

  it('makes the part and goes to it', async () => {
    await open();
    await type('Part number', ' LW-9 ');
    await type('Title', 'Channel');
    await make();
    const request = backend.expectOne({ method: 'POST', url: '/api/parts' });
    expect(request.request.body).toEqual({
      number: 'LW-9',
      title: 'Channel',
      document: jasmine.objectContaining({ format: 'leafwright/1', unit: 'in', thickness: '0.040' }),
    });
    request.flush({ id: 'part-9' });
    await settle();
    expect(TestBed.inject(Router).url).toBe('/parts/part-9');
    expect(sessionStorage.getItem('lw-new-part')).toBeNull();
  });

  it('says at the field that a number is taken, until it is changed', async () => {
    await open();
    await type('Part number', 'LW-9');
    await type('Title', 'Channel');
    await make();
    const message = 'There is a part LW-9 already.';
    backend
      .expectOne('/api/parts')
      .flush(
        { type: PROBLEM.taken, title: 'Taken', status: 409, errors: [{ path: 'number', message }] },
        { status: 409, statusText: '' },
      );
    await settle();
    expect(await (await field('Part number')).getTextErrors()).toEqual([message]);
    await type('Part number', 'LW-10');
    expect(await (await field('Part number')).hasErrors()).toBeFalse();
  });

  it('loses nothing when the server is lost, and claims nothing about the part', async () => {
    await open();
    await type('Part number', 'LW-9');
    await type('Title', 'Channel');
    await make();
    backend.expectOne('/api/parts').error(new ProgressEvent('error'));
    await settle();
    expect(element().textContent).toContain('may have been made');
    expect(element().textContent).not.toContain('is not made yet');
    expect(await valueOf('Part number')).toBe('LW-9');
  });

  describe('after an answer that was lost', () => {
    let sent: CreatePart;

    beforeEach(async () => {
      await open();
      await type('Part number', 'lw-9');
      await type('Title', 'Channel');
      await make();
      const request = backend.expectOne('/api/parts');
      sent = request.request.body as CreatePart;
      request.error(new ProgressEvent('error'));
      await settle();
    });

    const refuse = async (): Promise<void> => {
      await make();
      backend
        .expectOne({ method: 'POST', url: '/api/parts' })
        .flush(
          { type: PROBLEM.taken, title: 'Taken', status: 409, errors: [{ path: 'number', message: 'Taken.' }] },
          { status: 409, statusText: '' },
        );
      await settle();
    };
    const found = async (change: Partial<Part>): Promise<void> => {
      backend
        .expectOne((request) => request.method === 'GET' && request.params.get('search') === 'lw-9')
        .flush(sampleList([sampleRow('19', { number: 'LW-9-1' }), sampleRow('9', { number: 'lw-9' })]));
      await settle();
      const { document, number, title } = sent;
      const swapped = Object.fromEntries(Object.entries(document as object).reverse());
      backend
        .expectOne('/api/parts/9')
        .flush({ id: '9', number, title, createdBy: 'Avery Example', revision: { document: swapped }, ...change });
      await settle();
    };

    it('goes to the part that the first try has made', async () => {
      await refuse();
      await found({});
      expect(TestBed.inject(Router).url).toBe('/parts/9');
      expect(sessionStorage.getItem('lw-new-part')).toBeNull();
    });

    it('says where the part is when something else was typed since', async () => {
      await type('Overall width', '3');
      await refuse();
      await found({});
      expect(element().textContent).toContain('was made by the try whose answer was lost');
      expect(element().querySelector('.trouble a')?.getAttribute('href')).toBe('/parts/9');
    });

    it('leaves the part of somebody else alone', async () => {
      await refuse();
      await found({ createdBy: 'Wenna Other' });
      expect(element().querySelector('.trouble')?.textContent).toContain('Taken.');
      expect(await (await field('Part number')).getTextErrors()).toEqual(['Taken.']);
    });

    it('makes the part when the first try has not', async () => {
      await make();
      backend.expectOne({ method: 'POST', url: '/api/parts' }).flush({ id: 'part-9' });
      await settle();
      expect(TestBed.inject(Router).url).toBe('/parts/part-9');
    });
  });

  it('points at the word of a typed chain', async () => {
    await open();
    await toggle('Typed chain');
    await type('Typed chain', '1 upp 90 r.16 2');
    expect(element().querySelector('mark')?.textContent).toBe('upp');
    await type('Typed chain', '1 up 90 r.16 2 up 90 1');
    expect(element().querySelector('mark')).toBeNull();
    expect(element().querySelector('lw-live-section')?.textContent).toContain('3.758');
  });

  it('changes the unit of every length, and keeps what was typed the same length', async () => {
    await open();
    await type('Overall width', '1 1/8');
    await toggle('Millimetre');
    expect(await valueOf('Overall width')).toBe('28.575');
    expect(await valueOf('Thickness')).toBe('1');
  });

  it('takes up what was typed before a reload', async () => {
    await open();
    await type('Title', 'Half done');
    await toggle('Typed chain');
    await type('Typed chain', '1 up');
    fixture.destroy();
    await open();
    expect(await valueOf('Title')).toBe('Half done');
    expect(await valueOf('Typed chain')).toBe('1 up');
  });

  it('wants a document chosen before it makes a part from one', async () => {
    await open();
    await type('Part number', 'LW-9');
    await type('Title', 'Channel');
    await toggle('Part document');
    await make();
    expect(element().textContent).toContain('Choose a part document first.');
  });

  it('tells people without the role why not', async () => {
    roles = ['supervisor'];
    await open();
    expect(element().textContent).toContain('Only designers make new parts');
    expect(element().querySelector('form')).toBeNull();
  });
});
