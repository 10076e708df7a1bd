import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import { BLOCK_KIND_LIST } from '#shared/report';
import { Icon } from '../../ui/marks/icon';
import { BlockActions } from './block-actions';

/** Adds a block at this place: a menu of the kinds that this person may add. */
@Component({
  selector: 'eh-add-block',
  imports: [Icon, MatMenuModule],
  template: `
    <button
      type="button"
      [class]="label() === '' ? 'plus' : 'wide'"
      [matMenuTriggerFor]="kinds"
      [attr.aria-label]="label() === '' ? 'Add a block after ' + name() : null"
    >
      <eh-icon name="add" />
      {{ label() }}
    </button>
    <mat-menu #kinds="matMenu">
      @for (kind of offered(); track kind.id) {
        <button mat-menu-item (click)="actions.add(kind.id, after())">
          <span class="described">
            <b>{{ kind.label }}</b>
            <small>{{ kind.description }}</small>
          </span>
        </button>
      }
    </mat-menu>
  `,
  styleUrls: ['./add-block.scss', './described-item.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AddBlock {
  protected readonly actions = inject(BlockActions);

  /** Id of the block before; null for the top of the report. */
  readonly after = input.required<string | null>();
  readonly name = input('');
  /** Words on the button; without any it is a small plus. */
  readonly label = input('');

  protected readonly offered = computed(() =>
    BLOCK_KIND_LIST.filter((kind) => this.actions.mayChangeKind(kind.id)),
  );
}
