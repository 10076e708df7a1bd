import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { analysisIdsOf } from '#shared/report';
import { CurrentStudy } from '../../session/current-study';
import { counted } from '../../ui/words';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';

/** The left margin as a landmark: every analysis that the report shows, and in how many blocks. */
@Component({
  selector: 'eh-source-list',
  imports: [RouterLink],
  template: `
    <aside aria-label="Sources">
      <ul>
        @for (source of sources(); track source.id) {
          <li>
            <a [routerLink]="['/studies', studyId(), 'analyses', source.id]">{{ source.name }}</a>
            {{ source.blocks }}
          </li>
        } @empty {
          <li>No block shows an analysis yet.</li>
        }
      </ul>
    </aside>
  `,
  styleUrl: './landmark-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SourceList {
  private readonly state = inject(ReportState);
  private readonly store = inject(ReportStore);
  private readonly study = inject(CurrentStudy);

  protected readonly studyId = computed(() => this.study.study()?.id ?? '');
  protected readonly sources = computed(() => {
    const shown = this.store.blocks().flatMap(analysisIdsOf);
    return [...this.state.pins().values()]
      .filter(({ analysisId }) => shown.includes(analysisId))
      .map(({ analysisId, number, name }) => ({
        id: analysisId,
        name: `${number}, ${name}`,
        blocks: counted(shown.filter((id) => id === analysisId).length, 'block', 'blocks'),
      }));
  });
}
