import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { CopyButton } from '../../shared/copy-button';
import { PageHead } from '../../shared/page-head';

/** The head of a check's page: the address of what is asked, or an example to begin from. */
@Component({
  selector: 'app-check-head',
  imports: [CopyButton, PageHead],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './check-head.html',
  styleUrl: './check-head.scss',
})
export class CheckHead {
  readonly heading = input.required<string>();
  /** The address that carries the request; null while there is none. */
  readonly link = input.required<string | null>();
  /** Whether the address carried something that cannot be read. */
  readonly unreadable = input(false);
  /** An example is wanted. */
  readonly filledIn = output();
}
