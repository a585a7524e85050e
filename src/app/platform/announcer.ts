import { LiveAnnouncer } from '@angular/cdk/a11y';
import { inject, Injectable } from '@angular/core';
import { MatSnackBar } from '@angular/material/snack-bar';

const SHOWN_MS = 8000;

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
    this.snackBar.open(sentence, 'Close', { duration: SHOWN_MS });
  }

  /** Shows and speaks a sentence with one step to take, such as "Undo". */
  offer(sentence: string, step: string, take: () => void): void {
    this.snackBar.open(sentence, step, { duration: SHOWN_MS }).onAction().subscribe(take);
  }
}
