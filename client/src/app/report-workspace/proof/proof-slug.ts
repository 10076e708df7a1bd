import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { CurrentStudy } from '../../session/current-study';
import { shortDate } from '../../ui/dates';
import { counted } from '../../ui/words';
import { HouseStyleChoice } from '../report-page/house-style-choice';
import { ReportState } from '../report-store/report-state';
import { ReportProof } from './report-proof';
import { runsOf } from '#shared/report';

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
    const bound = this.proof.boundCount();
    const states = [...this.proof.blocks().values()].flatMap(({ elements }) =>
      elements.flatMap(runsOf).map((run) => run.origin?.state),
    );
    const typed = states.filter((state) => state === 'typed').length;
    const missing = states.filter((state) => state === 'missing').length;
    const all = counted(bound + typed + missing, 'number', 'numbers');
    return [
      `${all}: ${bound} bound`,
      ...(typed === 0 ? [] : [`${typed} typed`]),
      ...(missing === 0 ? [] : [`${missing} without source`]),
    ].join(', ');
  });
}
