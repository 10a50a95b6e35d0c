import type { ComponentType } from '@angular/cdk/portal';
import { inject, Injectable } from '@angular/core';
import { MatDialog, MatDialogConfig } from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';

interface Manner {
  readonly width: string;
  /** Set where a slip on Escape, or a click beside the dialog, would lose something. */
  readonly held?: boolean;
}

/** Opens dialogs, and waits for what they are closed with. */
@Injectable({ providedIn: 'root' })
export class Ask {
  private readonly dialog = inject(MatDialog);

  for<R>(component: ComponentType<unknown>, data: unknown, manner: Manner): Promise<R | undefined> {
    const config = new MatDialogConfig();
    config.data = data;
    config.width = manner.width;
    config.disableClose = manner.held ?? false;
    return firstValueFrom(this.dialog.open<unknown, unknown, R>(component, config).afterClosed());
  }
}
