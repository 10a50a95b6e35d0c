import { ChangeDetectionStrategy, Component } from '@angular/core';

const props = [60, 220, 380, 508];
const arrows = Array.from({ length: 15 }, (_, index) => 60 + index * 32);

/** A loaded waler on headtrees and props, with its dimensions. An ornament: it says nothing. */
@Component({
  selector: 'app-drawing',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg viewBox="0 0 560 400" aria-hidden="true" focusable="false">
      <path class="load" d="M60 48H508" />
      @for (x of arrows; track x) {
        <path class="load" [attr.d]="'M' + x + ' 48V92'" />
        <path class="tip" [attr.d]="'M' + (x - 3.5) + ' 88h7L' + x + ' 97z'" />
      }
      <path class="waler" d="M36 98H532V122H36z" />
      <path class="hair" d="M36 102H532M36 118H532" />
      @for (x of props; track x) {
        <path class="head" [attr.d]="'M' + (x - 34) + ' 122h68v13h-68z'" />
        <path class="line" [attr.d]="'M' + (x - 7) + ' 135V316M' + (x + 7) + ' 135V316'" />
        <path class="line" [attr.d]="'M' + (x - 30) + ' 135L' + (x - 7) + ' 166'" />
        <path class="line" [attr.d]="'M' + (x - 22) + ' 135L' + (x - 7) + ' 155'" />
        <path class="line" [attr.d]="'M' + (x + 30) + ' 135L' + (x + 7) + ' 166'" />
        <path class="line" [attr.d]="'M' + (x + 22) + ' 135L' + (x + 7) + ' 155'" />
        <path class="line" [attr.d]="'M' + (x - 20) + ' 316h40v7h-40z'" />
        <path class="quiet" [attr.d]="'M' + x + ' 340v32M' + (x - 4) + ' 364l8 -8'" />
      }
      <path class="ground" d="M20 323H548" />
      <path class="quiet" d="M48 360H520" />
      <text x="140" y="352">3.00</text>
      <text x="300" y="352">3.00</text>
      <text x="444" y="352">2.40</text>
    </svg>
  `,
  styles: `
    svg {
      display: block;
      width: 100%;
      max-width: 560px;
    }
    path {
      fill: none;
      stroke: var(--ink);
      stroke-width: 1;
    }
    .load,
    .tip {
      stroke: var(--timber);
    }
    .tip {
      fill: var(--timber);
      stroke: none;
    }
    .waler {
      fill: var(--wash);
      stroke-width: 1.25;
    }
    .hair {
      stroke: var(--rule);
    }
    .head {
      fill: color-mix(in srgb, var(--timber) 22%, var(--paper));
      stroke: var(--timber);
    }
    .ground {
      stroke: var(--galvanised);
    }
    .quiet {
      stroke: var(--galvanised);
      stroke-width: 0.8;
    }
    text {
      font: 12px var(--mono);
      fill: var(--quiet);
      text-anchor: middle;
    }
  `,
})
export class Drawing {
  protected readonly props = props;
  protected readonly arrows = arrows;
}
