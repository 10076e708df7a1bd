import { ChangeDetectionStrategy, Component, computed, ElementRef, inject } from '@angular/core';
import { scopeKey } from '#shared/analysis';
import { BenchStore } from '../bench/bench-store';
import { sameScope, scopeLabel } from '../bench/result-scopes';

/** More layers than this are picked from a list. */
const MOST_TABS = 5;

/** Which layer the estimates are of: all records, a stratum, or pooled. */
@Component({
  selector: 'eh-scope-tabs',
  template: `
    @if (tabs().length > mostTabs) {
      <label>
        <span class="third">Within</span>
        <select class="input" (change)="pick($any($event.target).selectedIndex)">
          @for (tab of tabs(); track tab.key) {
            <option [selected]="tab.isChosen">{{ tab.label }}</option>
          }
        </select>
      </label>
    } @else if (tabs().length > 1) {
      <div
        role="tablist"
        aria-label="Layer of the estimates"
        (keydown)="press($event)"
        tabindex="-1"
      >
        @for (tab of tabs(); track tab.key) {
          <button
            type="button"
            role="tab"
            [id]="'scope-tab-' + $index"
            [attr.aria-selected]="tab.isChosen"
            aria-controls="estimates"
            [tabindex]="tab.isChosen ? 0 : -1"
            (click)="pick($index)"
          >
            {{ tab.label }}
          </button>
        }
      </div>
    }
  `,
  styleUrl: './scope-tabs.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ScopeTabs {
  private readonly store = inject(BenchStore);
  private readonly element = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;

  protected readonly mostTabs = MOST_TABS;
  protected readonly tabs = computed(() => {
    const result = this.store.result();
    if (result === null) return [];
    return this.store.scopes().map((scope) => ({
      key: scopeKey(scope),
      label: scopeLabel(result, scope),
      isChosen: sameScope(scope, this.store.scope()),
    }));
  });

  protected pick(at: number): void {
    const scope = this.store.scopes()[at];
    if (scope !== undefined) this.store.scope.set(scope);
  }

  protected press(event: KeyboardEvent): void {
    const at = this.tabs().findIndex(({ isChosen }) => isChosen);
    const to = placeAfter(event.key, at, this.tabs().length);
    if (to === null) return;
    event.preventDefault();
    this.pick(to);
    this.element.querySelector<HTMLElement>(`#scope-tab-${to}`)?.focus();
  }
}

function placeAfter(key: string, at: number, count: number): number | null {
  switch (key) {
    case 'ArrowRight':
      return (at + 1) % count;
    case 'ArrowLeft':
      return (at + count - 1) % count;
    case 'Home':
      return 0;
    case 'End':
      return count - 1;
    default:
      return null;
  }
}
