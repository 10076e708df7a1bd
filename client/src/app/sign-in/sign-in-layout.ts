import { ChangeDetectionStrategy, Component } from '@angular/core';
import { Logo } from '../ui/marks/logo';
import { EffectArt } from './effect-art';

/** What the pages before the desk share: the form on a page, the effect on the spine beside it. */
@Component({
  selector: 'eh-sign-in-layout',
  imports: [EffectArt, Logo],
  template: `
    <main>
      <div class="wordmark">
        <eh-logo [size]="44" />
        <span>Evenhand</span>
      </div>
      <div class="middle"><ng-content /></div>
      <p class="foot"><ng-content select="[foot]" /></p>
    </main>
    <eh-effect-art role="complementary" aria-label="What Evenhand does" />
  `,
  styleUrl: './sign-in-layout.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInLayout {}
