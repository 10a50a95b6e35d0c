import { inject, Injectable } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { type RouterStateSnapshot, TitleStrategy } from '@angular/router';

@Injectable()
export class PageTitle extends TitleStrategy {
  private readonly title = inject(Title);

  override updateTitle(state: RouterStateSnapshot): void {
    this.name(this.buildTitle(state) ?? '');
  }

  name(page: string): void {
    this.title.setTitle(page === '' ? 'Headtree' : `${page} · Headtree`);
  }
}
