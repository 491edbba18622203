import { inject, Injectable } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { type RouterStateSnapshot, TitleStrategy } from '@angular/router';

/** `Quotes · Sealyard` */
@Injectable()
export class PageTitle extends TitleStrategy {
  private readonly title = inject(Title);

  override updateTitle(state: RouterStateSnapshot): void {
    const own = this.buildTitle(state);
    this.title.setTitle(own ? `${own} · Sealyard` : 'Sealyard: made-to-size sealed units');
  }
}
