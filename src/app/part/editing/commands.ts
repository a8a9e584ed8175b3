import { isLeg } from '@shared/part/document';
import { addLegAfter, addLegAtStart } from '@shared/part/edits/add-leg';
import { removeBend, whyBendStays } from '@shared/part/edits/remove-bend';
import type { PartEditor } from './part-editor';

/** One record a command: button, menu and key all come from it. */
export interface Command {
  readonly id: CommandId;
  readonly words: string;
  /** As a person reads it and as `keyOf` writes an event; the first is shown. */
  readonly keys: readonly string[];
  readonly when: (editor: PartEditor) => boolean;
  readonly run: (editor: PartEditor) => void;
  /** What comes next is done in the row that is selected then. */
  readonly goesOn?: true;
  /** Its key takes away, so that in a box that holds text it is the box's. */
  readonly yieldsToText?: true;
}

export type CommandId = 'undo' | 'redo' | 'add-at-end' | 'add-at-start' | 'add-after' | 'remove-bend' | 'deselect';

const selectedEntry = (editor: PartEditor): { index: number; isLeg: boolean } | null => {
  const index = editor.selection();
  const entry = index === null ? undefined : editor.document().chain[index];
  return index === null || !entry ? null : { index, isLeg: isLeg(entry) };
};

export const COMMANDS: readonly Command[] = [
  {
    id: 'undo',
    words: 'Undo',
    keys: ['Ctrl+Z'],
    when: (editor) => editor.canUndo(),
    run: (editor) => editor.undo(),
  },
  {
    id: 'redo',
    words: 'Redo',
    keys: ['Ctrl+Shift+Z', 'Ctrl+Y'],
    when: (editor) => editor.canRedo(),
    run: (editor) => editor.redo(),
  },
  {
    id: 'add-at-end',
    words: 'Add a leg at the end',
    keys: ['Alt+Enter'],
    when: (editor) => editor.mayEdit(),
    run: (editor) => {
      const last = editor.document().chain.length - 1;
      editor.apply((document) => addLegAfter(document, last));
      editor.select(last + 2);
    },
    goesOn: true,
  },
  {
    id: 'add-at-start',
    words: 'Add a leg at the start',
    keys: ['Alt+Shift+Enter'],
    when: (editor) => editor.mayEdit(),
    run: (editor) => {
      editor.apply(addLegAtStart);
      editor.select(0);
    },
    goesOn: true,
  },
  {
    id: 'add-after',
    words: 'Insert a bend and a leg after it',
    keys: ['Alt+I'],
    when: (editor) => editor.mayEdit() && (selectedEntry(editor)?.isLeg ?? false),
    run: (editor) => {
      const index = editor.selection() ?? 0;
      editor.apply((document) => addLegAfter(document, index));
      editor.select(index + 2);
    },
    goesOn: true,
  },
  {
    id: 'remove-bend',
    words: 'Take the bend out and join its legs',
    keys: ['Alt+Backspace'],
    when: (editor) => {
      const entry = selectedEntry(editor);
      return editor.mayEdit() && entry !== null && whyBendStays(editor.document(), entry.index) === null;
    },
    run: (editor) => {
      const index = editor.selection() ?? 0;
      editor.apply((document) => removeBend(document, index));
      editor.select(index - 1);
    },
    goesOn: true,
    yieldsToText: true,
  },
  {
    id: 'deselect',
    words: 'Select nothing',
    keys: ['Escape'],
    when: (editor) => editor.selection() !== null,
    run: (editor) => editor.select(null),
  },
];

const byId = new Map(COMMANDS.map((command) => [command.id, command]));

export function commandOf(id: CommandId): Command {
  const command = byId.get(id);
  if (!command) throw new Error(`No command is called ${id}.`);
  return command;
}

/** "Ctrl+Shift+Z"; the command key of a Mac counts as Ctrl. */
export function keyOf(event: Pick<KeyboardEvent, 'key' | 'ctrlKey' | 'metaKey' | 'altKey' | 'shiftKey'>): string {
  const key = event.key.length === 1 ? event.key.toUpperCase() : event.key;
  const held = [event.ctrlKey || event.metaKey ? 'Ctrl' : '', event.altKey ? 'Alt' : '', event.shiftKey ? 'Shift' : ''];
  return [...held.filter((name) => name !== ''), key].join('+');
}

/** @param target what has the focus */
export function commandFor(key: string, editor: PartEditor, target: EventTarget | null = null): Command | null {
  const command = COMMANDS.find((one) => one.keys.includes(key) && one.when(editor)) ?? null;
  return command?.yieldsToText && holdsText(target) ? null : command;
}

/** Undo and redo are the page's own even when there is nothing to take back: the browser's would put old text into a box. */
export const isHistoryKey = (key: string): boolean =>
  COMMANDS.some(({ id, keys }) => (id === 'undo' || id === 'redo') && keys.includes(key));

const holdsText = (target: EventTarget | null): boolean =>
  (target instanceof HTMLInputElement || target instanceof HTMLTextAreaElement) && target.value !== '';
