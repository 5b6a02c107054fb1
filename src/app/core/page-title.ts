import { inject, Injectable } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { TitleStrategy, type RouterStateSnapshot } from '@angular/router';

/** `Sets · Thenworth`. Pages that know more say it with `name`. */
@Injectable({ providedIn: 'root' })
export class PageTitle extends TitleStrategy {
  private readonly title = inject(Title);

  override updateTitle(state: RouterStateSnapshot): void {
    this.name(this.buildTitle(state) ?? '');
  }

  name(page: string): void {
    this.title.setTitle(page === '' ? 'Thenworth' : `${page} · Thenworth`);
  }
}
