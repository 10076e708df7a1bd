import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { expect, it } from 'vitest';
import { App } from './app';
import { routes } from './app.routes';

it('opens the desk at the root address', async () => {
  TestBed.configureTestingModule({ providers: [provideRouter(routes)] });
  const fixture = TestBed.createComponent(App);
  await TestBed.inject(Router).navigateByUrl('/');
  await expect
    .poll(() => (fixture.nativeElement as HTMLElement).querySelector('h1')?.textContent)
    .toBe('Your desk');
});
