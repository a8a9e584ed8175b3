import { ChangeDetectionStrategy, Component } from '@angular/core';

/** A hat section over the blank it is bent from, as the drawings in the app show them. For the eye only: it has no figures. */
@Component({
  selector: 'lw-bend-picture',
  templateUrl: './bend-picture.svg',
  styleUrl: './bend-picture.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BendPicture {}
