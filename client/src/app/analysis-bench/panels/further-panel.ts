import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import {
  addressKey,
  type AddressedQuantity,
  type AddressFacet,
  readValue,
  type ValueAddress,
} from '#shared/analysis';
import { boundText, type PinnedAnalysis, valueWords } from '#shared/report';
import { issueWords } from '#shared/wording';
import { BenchStore } from '../bench/bench-store';
import { contrastLabel, scopeLabel } from '../bench/result-scopes';
import { type BenchPrint, sentenceOf } from '../print/bench-print';

/** A further number of the contrast in view: what it is, and its print or why there is none. */
interface FurtherNumber {
  readonly what: string;
  readonly text: string;
  readonly isEstimable: boolean;
  /** The test of no interaction, where there is one. */
  readonly test: string | null;
}

const BETWEEN_STRATA = [
  'interaction:riskDifference',
  'interaction:riskRatio',
  'interaction:oddsRatio',
  'excessRisk',
] as const;

const IMPACT = ['fractionInExposed', 'populationFraction', 'eValue'] as const;

/** How the contrast differs between two strata, and its impact if it is read as causal. */
@Component({
  selector: 'eh-further-panel',
  template: `
    <header>
      <h2>Between strata, and impact</h2>
      <span class="third">{{ about() }}</span>
    </header>
    @if (between().length > 0) {
      <h3>Interaction</h3>
      <dl>
        @for (number of between(); track number.what) {
          <div>
            <dt>{{ number.what }}</dt>
            <dd [class.numeric]="number.isEstimable" [class.reason]="!number.isEstimable">
              {{ number.text }}
              @if (number.test !== null) {
                <span class="third">{{ number.test }}</span>
              }
            </dd>
          </div>
        }
      </dl>
      <p class="foot second">
        Additive and multiplicative interaction are different questions: give both. Such tests have
        little power.
      </p>
    }
    @if (impact().length > 0) {
      <h3>Impact</h3>
      <dl>
        @for (number of impact(); track number.what) {
          <div>
            <dt>{{ number.what }}</dt>
            <dd [class.numeric]="number.isEstimable" [class.reason]="!number.isEstimable">
              {{ number.text }}
            </dd>
          </div>
        }
      </dl>
      <p class="foot second">
        These mean something only if the exposure causes the difference: that is for the study's
        authors to argue. None of them says how many cases could be prevented in practice.
      </p>
    }
  `,
  styleUrl: './further-panel.scss',
  host: { '[hidden]': 'between().length === 0 && impact().length === 0' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FurtherPanel {
  private readonly store = inject(BenchStore);

  protected readonly about = computed(() => {
    const print = this.store.print();
    if (print === null) return '';
    const { result } = print;
    const contrast = contrastLabel(result, this.store.levelId());
    return `${scopeLabel(result, this.store.scope())}, ${contrast}`;
  });
  protected readonly between = computed(() => {
    const scope = { kind: 'pooled' } as const;
    return this.numbers(BETWEEN_STRATA, (quantity) => ({ quantity, scope }));
  });
  protected readonly impact = computed(() => {
    const scope = this.store.scope();
    return this.numbers(IMPACT, (quantity) => ({ quantity, scope }));
  });

  private numbers(
    quantities: readonly AddressedQuantity[],
    placeOf: (quantity: AddressedQuantity) => Pick<ValueAddress, 'quantity' | 'scope'>,
  ): readonly FurtherNumber[] {
    const [print, levelId] = [this.store.print(), this.store.levelId()];
    if (print === null || levelId === null) return [];
    return quantities.flatMap((quantity) => {
      const at = { analysisId: 'bench', levelId, ...placeOf(quantity) };
      const number = furtherNumber(print, at);
      return number === null ? [] : [number];
    });
  }
}

/** Null where the result has no such number, or where the design cannot give it. */
function furtherNumber(print: BenchPrint, at: Omit<ValueAddress, 'facet'>): FurtherNumber | null {
  const address = (facet: AddressFacet): ValueAddress => ({ ...at, facet });
  const read = readValue(print.result, address('value'));
  const code = read.ok ? null : read.issue.code;
  if (code === 'addressNotInResult' || code === 'notGivenByDesign') return null;
  const { what } = valueWords(address('value'), pinOf(print), print.book);
  if (!read.ok) {
    const reason = sentenceOf(`not estimable: ${issueWords(read.issue, print.book)}`);
    return { what, text: reason, isEstimable: false, test: null };
  }
  const pValue = readValue(print.result, address('pValue'));
  return {
    what,
    text: `${printed(print, address('value'))}${limitWords(print, at)}`,
    isEstimable: true,
    test: pValue.ok ? printed(print, address('pValue')) : null,
  };
}

/** An E-value has one for the limit nearer to 1 in place of limits. */
function limitWords(print: BenchPrint, at: Omit<ValueAddress, 'facet'>): string {
  if (at.quantity !== 'eValue') return '';
  const limit = printed(print, { ...at, facet: 'lower' });
  return `; ${limit} for the limit nearer to 1`;
}

function printed(print: BenchPrint, address: ValueAddress): string {
  const pins = new Map([['bench', pinOf(print)]]);
  const context = { pins, houseStyle: print.style, phrasebook: print.book };
  const text = boundText(addressKey(address), 'withLimits', context);
  return text.parts.map((part) => part.text).join('');
}

function pinOf({ result }: BenchPrint): PinnedAnalysis {
  const cut = { id: '', number: 0, dataDate: '' };
  return { analysisId: 'bench', number: '', name: '', resultId: '', cut, result };
}
