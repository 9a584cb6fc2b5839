import { inject, Injectable, InjectionToken, type Provider } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { type RouterStateSnapshot, TitleStrategy } from '@angular/router';

const APPLICATION_NAME = new InjectionToken<string>('name of the application in the window title');

/** Window titles as "Page · Application"; a route without a title shows the application alone. */
@Injectable()
class PageTitle extends TitleStrategy {
  private readonly title = inject(Title);
  private readonly application = inject(APPLICATION_NAME);

  override updateTitle(state: RouterStateSnapshot): void {
    const page = this.buildTitle(state);
    this.title.setTitle(page === undefined ? this.application : `${page} · ${this.application}`);
  }
}

/** Titles windows by their route's `title` and the application's name. */
export function providePageTitle(application: string): Provider[] {
  return [
    { provide: APPLICATION_NAME, useValue: application },
    { provide: TitleStrategy, useClass: PageTitle },
  ];
}
