import { ChangeDetectionStrategy, Component, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Icon } from '../ui/icon';

/** The whole page when the first question, who is signed in, got no answer. */
@Component({
  selector: 'lw-lost-server',
  imports: [MatButtonModule, Icon],
  template: `
    <section>
      <lw-icon name="lost" />
      <h1>No answer from the server</h1>
      <p>The server of your shop can't be reached from this computer. You are not signed out and nothing is lost.</p>
      <button matButton="filled" type="button" (click)="again.emit()">Try again</button>
    </section>
  `,
  styleUrl: './whole-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LostServer {
  readonly again = output();
}
