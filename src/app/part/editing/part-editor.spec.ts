import { provideZonelessChangeDetection } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { setLegDimension } from '@shared/part/edits/set-leg-dimension';
import { printTypedChain } from '@shared/part/typed-chain';
import { NEVER } from 'rxjs';
import { Server } from '../../server/server';
import { channel, part } from '../sample-part';
import { Autosave } from '../saving/autosave';
import { LeftBehind } from '../saving/left-behind';
import { isHistoryKey, commandFor, commandOf, keyOf } from './commands';
import { PartEditor } from './part-editor';

describe('the editor of a part', () => {
  let editor: PartEditor;

  beforeEach(() => {
    localStorage.clear();
    const server = { saveRevision: () => NEVER };
    TestBed.configureTestingModule({
      providers: [
        provideZonelessChangeDetection(),
        Autosave,
        LeftBehind,
        PartEditor,
        { provide: Server, useValue: server },
      ],
    });
    editor = TestBed.inject(PartEditor);
    editor.open(part(), 'me', true);
  });

  afterEach(() => localStorage.clear());

  const setWeb = (typed: string | number, gesture: string | null = null): void =>
    editor.apply((document) => setLegDimension(document, 2, typed), gesture);
  const flats = (): string[] => editor.drawn()!.legs.map((leg) => leg.flat.toFixed(2));

  it('counts a typed chain as not taken while it differs from the chain as it stands', () => {
    const autosave = TestBed.inject(Autosave);
    editor.typeChain(printTypedChain(channel.chain));
    expect(autosave.untaken()).toBeNull();
    editor.typeChain('1 up 90 r.16 2 up 90 3');
    expect(editor.typedChain()).toBe('1 up 90 r.16 2 up 90 3');
    expect(autosave.untaken()).toBe('1 up 90 r.16 2 up 90 3');
    editor.typeChain(null);
    expect(autosave.untaken()).toBeNull();
  });

  it('computes the handbook channel', () => {
    expect(flats()).toEqual(['0.80', '1.60', '0.80']);
    expect(editor.drawn()!.bends.map((bend) => bend.allowance.toFixed(3))).toEqual(['0.279', '0.279']);
    expect(editor.drawn()!.developedLength!.toFixed(3)).toBe('3.758');
  });

  it('undoes and redoes', () => {
    setWeb(3);
    expect(flats()[1]).toBe('2.60');
    editor.undo();
    expect(editor.document()).toBe(editor.part()!.revision.document);
    editor.redo();
    expect(flats()[1]).toBe('2.60');
  });

  it('takes back a whole gesture', () => {
    for (const typed of ['3', '3.', '3.5']) setWeb(typed, 'leg 2');
    expect(flats()[1]).toBe('3.10');
    editor.cancelGesture();
    expect(editor.document().chain).toEqual(channel.chain);
    expect(editor.canUndo()).toBeFalse();
  });

  it('keeps the last good figures while something typed is broken, and says where', () => {
    setWeb('abc');
    expect(editor.isCurrent()).toBeFalse();
    expect(editor.messages().get('chain/2/leg')).toBeTruthy();
    expect(flats()[1]).toBe('1.60');
    expect(editor.document().chain[2]).toEqual({ leg: 'abc', name: 'Web' });
    setWeb('1 3/16');
    expect(editor.isCurrent()).toBeTrue();
    expect(editor.drawn()!.legs[1]!.dimension).toBe(1.1875);
  });

  it('changes nothing for those who may only read', () => {
    editor.open(part(), 'me', false);
    setWeb(3);
    expect(editor.document()).toBe(editor.part()!.revision.document);
    expect(editor.canUndo()).toBeFalse();
  });

  it('shows figures in the other unit without touching the part', () => {
    expect(editor.figureOf()(1)).toBe('1.000');
    editor.showIn('mm');
    expect(editor.figureOf()(1)).toBe('25.40');
    expect(editor.document().unit).toBe('in');
  });

  it('is not current while a typed chain waits to be taken', () => {
    expect(editor.isCurrent()).toBeTrue();
    editor.typeChain('1 up 90');
    expect(editor.isCurrent()).toBeFalse();
    expect(editor.whyNotCurrent()).toContain('typed chain');
    editor.typeChain(null);
    expect(editor.isCurrent()).toBeTrue();
  });

  it('selects only what is there', () => {
    editor.select(4);
    expect(editor.selection()).toBe(4);
    commandOf('deselect').run(editor);
    expect(editor.selection()).toBeNull();
    editor.select(99);
    expect(editor.selection()).toBeNull();
  });

  it('adds and takes out through its commands', () => {
    commandOf('add-at-end').run(editor);
    expect(editor.counts()).toEqual({ legs: 4, bends: 3 });
    expect(editor.selection()).toBe(6);
    editor.select(5);
    commandOf('remove-bend').run(editor);
    expect(editor.counts()).toEqual({ legs: 3, bends: 2 });
    commandOf('add-at-start').run(editor);
    expect(editor.selection()).toBe(0);
  });

  it('finds a command by its key, when it can be done', () => {
    const key = (more: Partial<KeyboardEvent>): string =>
      keyOf({ key: 'z', ctrlKey: false, metaKey: false, altKey: false, shiftKey: false, ...more });
    expect(key({ ctrlKey: true, shiftKey: true })).toBe('Ctrl+Shift+Z');
    expect(key({ metaKey: true })).toBe('Ctrl+Z');
    expect(commandFor('Ctrl+Z', editor)).toBeNull();
    // The page keeps the key all the same: the browser's own undo would put old text into a box.
    expect(isHistoryKey('Ctrl+Z')).toBeTrue();
    expect(isHistoryKey('Alt+Enter')).toBeFalse();
    setWeb(3);
    expect(commandFor('Ctrl+Z', editor)?.id).toBe('undo');
  });
});
