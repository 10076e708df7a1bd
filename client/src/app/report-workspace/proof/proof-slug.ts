import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { CurrentStudy } from '../../session/current-study';
import { shortDate } from '../../ui/dates';
import { counted } from '../../ui/words';
import { HouseStyleChoice } from '../report-page/house-style-choice';
import { ReportState } from '../report-store/report-state';
import type { PrintedBlock } from './printed-block';
import { ReportProof } from './report-proof';

/** The strip over the page that printers cut off: which proof, of which data, in which style. */
@Component({
  selector: 'eh-proof-slug',
  imports: [HouseStyleChoice],
  template: `
    <span>Proof {{ state.report()?.seq }}</span>
    @for (cut of cuts(); track cut) {
      <span>{{ cut }}</span>
    }
    <span class="style">
      @if (mayChooseStyle()) {
        <eh-house-style-choice />
      } @else {
        House style: {{ state.houseStyle()?.name }}
      }
    </span>
    <span class="numbers">{{ numbers() }}</span>
    <span class="inks" aria-hidden="true">
      @for (ink of inks; track ink) {
        <i [style.background]="ink"></i>
      }
    </span>
  `,
  styleUrl: './proof-slug.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProofSlug {
  private readonly study = inject(CurrentStudy);
  private readonly proof = inject(ReportProof);
  protected readonly state = inject(ReportState);

  protected readonly inks = ['lv1', 'lv2', 'lv3', 'lv4', 'lv5', 'ct2', 'ct3', 'ct4'].map(
    (name) => `var(--${name})`,
  );
  protected readonly mayChooseStyle = computed(
    () => this.state.isOpen() && this.study.may('editHouseStyle'),
  );
  protected readonly cuts = computed(() => {
    const pins = [...this.state.pins().values()];
    return [...new Set(pins.map(({ cut }) => `Cut ${cut.number}, ${shortDate(cut.dataDate)}`))];
  });
  protected readonly numbers = computed(() => {
    const blocks = [...this.proof.blocks().values()];
    const sum = (count: (printed: PrintedBlock) => number): number =>
      blocks.reduce((total, printed) => total + count(printed), 0);
    const bound = sum((printed) => printed.bound.length);
    const typed = sum((printed) => printed.typed.length);
    const missing = sum((printed) => printed.missing);
    const all = counted(bound + typed + missing, 'number', 'numbers');
    return [
      `${all}: ${bound} bound`,
      ...(typed === 0 ? [] : [`${typed} typed`]),
      ...(missing === 0 ? [] : [`${missing} without source`]),
    ].join(', ');
  });
}
