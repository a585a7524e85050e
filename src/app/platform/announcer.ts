import { LiveAnnouncer } from '@angular/cdk/a11y';
import { inject, Injectable } from '@angular/core';
import { MatSnackBar } from '@angular/material/snack-bar';

const SHOWN = { duration: 8000, horizontalPosition: 'start' } as const;

/** Says things: aloud for screen readers, or in a bar at the bottom for everyone. */
@Injectable({ providedIn: 'root' })
export class Announcer {
  private readonly live = inject(LiveAnnouncer);
  private readonly snackBar = inject(MatSnackBar);

  /** Speaks without showing anything; a newer sentence replaces one that still waits. */
  speak(sentence: string): void {
    void this.live.announce(sentence, 'polite');
  }

  /** Shows and speaks a sentence. */
  tell(sentence: string): void {
    this.snackBar.open(sentence, 'Close', SHOWN);
  }

  /** Shows and speaks a sentence with one step to take, such as "Undo". */
  offer(sentence: string, step: string, take: () => void): void {
    this.snackBar.open(sentence, step, SHOWN).onAction().subscribe(take);
  }
}
