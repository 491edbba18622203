import { inject, Injectable } from '@angular/core';
import { type RouterStateSnapshot, TitleStrategy } from '@angular/router';
import { type Head, PageMeta } from './ui/page-meta';

/** `Quotes · Sealyard`; a public page says more of itself, in the `head` of its route's data. */
@Injectable()
export class PageTitle extends TitleStrategy {
  private readonly meta = inject(PageMeta);

  override updateTitle(state: RouterStateSnapshot): void {
    let route = state.root;
    while (route.firstChild) route = route.firstChild;
    const head = route.data['head'] as Head | undefined;
    if (head) return this.meta.show(head);
    const own = this.buildTitle(state);
    this.meta.clear(own ? `${own} · Sealyard` : 'Sealyard: made-to-size sealed units');
  }
}
