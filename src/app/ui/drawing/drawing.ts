import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { type Drawing as DrawingData, type Fill, type Hatch, hatches, type Item, type Role } from '@shared/drawings/drawing';
import { DrawingIds } from './drawing-ids';

/**
 * Renders a drawing as SVG in the colours of the theme. In a flex row, drawings share the room in
 * proportion to their widths, so that all of them are at one scale.
 */
@Component({
  selector: 'app-drawing',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './drawing.html',
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
    svg {
      display: block;
      width: 100%;
      height: auto;
      font-family: Lato, sans-serif;
      print-color-adjust: exact;
    }
  `,
  host: { '[style.flex]': 'share()' },
})
export class Drawing {
  readonly drawing = input.required<DrawingData>();

  protected readonly id = inject(DrawingIds).next();
  protected readonly viewBox = computed(() => `0 0 ${this.drawing().width} ${this.drawing().height}`);
  protected readonly share = computed(() => `${this.drawing().width} 1 0px`);
  protected readonly patterns = computed(() =>
    [...new Set(this.drawing().items.flatMap(hatchOf))].map((hatch) => ({ id: this.patternId(hatch), tile: hatches[hatch] })),
  );

  protected color(role: Role | undefined): string {
    return role ? `var(--sy-${role})` : 'none';
  }

  protected paint(fill: Fill | undefined): string {
    return typeof fill === 'object' ? `url(#${this.patternId(fill.hatch)})` : this.color(fill);
  }

  protected dash(item: Item): string | null {
    return item.kind !== 'text' && item.dash ? item.dash.join(' ') : null;
  }

  private patternId(hatch: Hatch): string {
    return `${this.id}-${hatch.replaceAll(' ', '-')}`;
  }
}

function hatchOf(item: Item): Hatch[] {
  return 'fill' in item && typeof item.fill === 'object' ? [item.fill.hatch] : [];
}
