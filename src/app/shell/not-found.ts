import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';

@Component({
  selector: 'lw-not-found',
  imports: [MatButtonModule, RouterLink],
  template: `
    <section>
      <h1>There is nothing at this address</h1>
      <p>Perhaps the address was cut off or mistyped. Every part can be found in the register.</p>
      <a matButton="filled" routerLink="/parts">To the parts</a>
    </section>
  `,
  styleUrl: './whole-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotFound {}
