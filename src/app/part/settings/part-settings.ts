import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { METHOD_WORDS } from '@shared/part/allowance-words';
import type { Allowance, Hardness } from '@shared/part/document';
import { setAllowance } from '@shared/part/edits/set-allowance';
import { setGrain, setMaterial, setThickness, setWidth } from '@shared/part/edits/set-sheet';
import { MATERIALS } from '@shared/reference/materials';
import { PartEditor } from '../editing/part-editor';
import { needsReading, typedExpression } from '../../ui/typed-expression';
import { ExpressionField } from '../../ui/expression-field';
import { PART_METHODS } from '../words';

const HARDNESSES: readonly Hardness[] = ['soft', 'medium', 'hard'];
/** What a K-factor starts from when the method is chosen; a middle figure, to be replaced by the part's own. */
const STARTING_K = 0.44;

/** The sheet as a whole: thickness, width, material, grain, and the rule for the bend allowance. */
@Component({
  selector: 'lw-part-settings',
  imports: [ExpressionField],
  templateUrl: './part-settings.html',
  styleUrl: './part-settings.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PartSettings {
  protected readonly editor = inject(PartEditor);
  protected readonly hardnesses = HARDNESSES;
  protected readonly methodWords = METHOD_WORDS;

  protected readonly document = this.editor.document;
  protected readonly material = computed(() => {
    const material = this.document().material;
    return typeof material === 'object' ? material.name : (material ?? '');
  });
  /** The reference table, and whatever the document brought that is not in it. */
  protected readonly materials = computed(() => {
    const names = MATERIALS.map((material) => material.name);
    const own = this.material();
    return own === '' || names.includes(own) ? names : [own, ...names];
  });
  protected readonly methods = computed((): readonly Allowance['method'][] => {
    const { method } = this.document().allowance;
    return PART_METHODS.includes(method) ? PART_METHODS : [method, ...PART_METHODS];
  });
  protected readonly k = computed(() => {
    const { allowance } = this.document();
    return 'k' in allowance ? allowance.k : null;
  });
  protected readonly hardness = computed(() => {
    const { allowance } = this.document();
    return allowance.method === 'rule-90' ? allowance.hardness : null;
  });
  protected readonly thicknessRead = computed(() => {
    const result = this.editor.result();
    return result.ok && needsReading(this.document().thickness) ? String(Number(result.thickness.toFixed(5))) : null;
  });
  protected readonly widthRead = computed(() => {
    const result = this.editor.result();
    const { width } = this.document();
    const read = result.ok ? result.blank.width : null;
    return width !== undefined && read !== null && needsReading(width) ? String(Number(read.toFixed(5))) : null;
  });

  protected message(path: string): string | null {
    return this.editor.messages().get(path) ?? null;
  }

  protected typeThickness(text: string): void {
    this.editor.apply((document) => setThickness(document, typedExpression(text)), 'thickness');
  }

  protected typeWidth(text: string): void {
    const width = text.trim() === '' ? undefined : typedExpression(text);
    this.editor.apply((document) => setWidth(document, width), 'width');
  }

  protected chooseMaterial(name: string): void {
    // The document's own material has figures that its name alone would lose.
    if (name !== this.material())
      this.editor.apply((document) => setMaterial(document, name === '' ? undefined : name));
  }

  protected chooseGrain(grain: string): void {
    const chosen = grain === 'along' || grain === 'across' ? grain : undefined;
    this.editor.apply((document) => setGrain(document, chosen));
  }

  protected chooseMethod(method: string): void {
    const allowance = this.methodFrom(method);
    if (allowance) this.editor.apply((document) => setAllowance(document, allowance));
  }

  protected typeK(text: string): void {
    const { allowance } = this.document();
    if (!('k' in allowance)) return;
    this.editor.apply((document) => setAllowance(document, { ...allowance, k: typedExpression(text) }), 'k');
  }

  protected chooseHardness(value: string): void {
    const hardness = HARDNESSES.find((one) => one === value);
    if (hardness) this.editor.apply((document) => setAllowance(document, { method: 'rule-90', hardness }));
  }

  private methodFrom(method: string): Allowance | null {
    switch (method) {
      case 'handbook':
      case 'din-6935':
        return { method };
      case 'k-factor':
        return { method, k: this.k() ?? STARTING_K };
      case 'rule-90':
        return { method, hardness: this.hardness() ?? 'medium' };
      default:
        return null;
    }
  }
}
