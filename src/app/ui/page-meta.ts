import { DOCUMENT, inject, Injectable, REQUEST_CONTEXT } from '@angular/core';
import { Meta, Title } from '@angular/platform-browser';

/** What a public page says of itself to search engines and to whoever shares a link to it. */
export interface Head {
  /** without the product's name */
  title: string;
  description: string;
  /** the page's one address, without query: `/catalogue/gases` */
  path: string;
  /** where the page stands, outermost first, without the page itself */
  trail?: readonly { name: string; path: string }[];
  /** further things of schema.org; addresses in them are paths */
  structured?: readonly StructuredThing[];
  /** a page that is not to be found, such as one for what does not exist */
  hidden?: boolean;
}

export type StructuredThing = { '@type': string } & Record<string, unknown>;

const NAME = 'Sealyard';
const described = ['description', 'robots'] as const;
const shared = ['og:title', 'og:description', 'og:type', 'og:url', 'og:site_name', 'og:image', 'og:image:alt'] as const;

/** Writes the head of a page: title, description, canonical address, Open Graph, structured data. */
@Injectable({ providedIn: 'root' })
export class PageMeta {
  private readonly document = inject(DOCUMENT);
  private readonly title = inject(Title);
  private readonly meta = inject(Meta);
  private readonly publicUrl = (inject(REQUEST_CONTEXT, { optional: true }) as { publicUrl?: string } | null)?.publicUrl;
  /** The server knows the public address; in the browser the page that arrived tells it. */
  private readonly origin = this.publicUrl ?? this.arrivedOrigin();

  show(head: Head): void {
    const full = head.path === '/' ? head.title : `${head.title} · ${NAME}`;
    const url = `${this.origin}${head.path}`;
    this.title.setTitle(full);
    this.meta.updateTag({ name: 'description', content: head.description });
    if (head.hidden) {
      this.meta.updateTag({ name: 'robots', content: 'noindex' });
      this.link(null);
    } else {
      this.meta.removeTag('name="robots"');
      this.link(url);
    }
    const open: Record<(typeof shared)[number], string> = {
      'og:title': full,
      'og:description': head.description,
      'og:type': 'website',
      'og:url': url,
      'og:site_name': NAME,
      'og:image': `${this.origin}/share.png`,
      'og:image:alt': 'A section through the edge of a sealed unit: two lites, the spacer between them and both seals',
    };
    for (const property of shared) this.meta.updateTag({ property, content: open[property] });
    this.structure(head.hidden ? [] : [...this.trail(head, url), ...(head.structured ?? [])]);
  }

  /** For pages that speak to those who are signed in: nothing to be found or shared. */
  clear(title: string): void {
    this.title.setTitle(title);
    for (const name of described) this.meta.removeTag(`name="${name}"`);
    for (const property of shared) this.meta.removeTag(`property="${property}"`);
    this.link(null);
    this.structure([]);
  }

  private trail({ title, trail }: Head, url: string): StructuredThing[] {
    if (!trail) return [];
    const steps = [...trail.map(({ name, path }) => ({ name, item: `${this.origin}${path}` })), { name: title, item: url }];
    return [
      {
        '@type': 'BreadcrumbList',
        itemListElement: steps.map((step, i) => ({ '@type': 'ListItem', position: i + 1, ...step })),
      },
    ];
  }

  private link(url: string | null): void {
    let link = this.document.head.querySelector<HTMLLinkElement>('link[rel=canonical]');
    if (url === null) return link?.remove();
    if (!link) {
      link = this.document.createElement('link');
      link.setAttribute('rel', 'canonical');
      this.document.head.appendChild(link);
    }
    link.setAttribute('href', url);
  }

  private structure(things: readonly StructuredThing[]): void {
    const type = 'application/ld+json';
    let script = this.document.head.querySelector(`script[type="${type}"]`);
    if (things.length === 0) return script?.remove();
    if (!script) {
      script = this.document.createElement('script');
      script.setAttribute('type', type);
      this.document.head.appendChild(script);
    }
    const text = JSON.stringify({ '@context': 'https://schema.org', '@graph': things.map((thing) => this.absolute(thing)) });
    // `</script>` in a text must not end the element.
    script.textContent = text.replaceAll('<', '\\u003c');
  }

  /** Paths under `url`, `@id` and the like as whole addresses. */
  private absolute(value: unknown): unknown {
    if (Array.isArray(value)) return value.map((each) => this.absolute(each));
    if (typeof value !== 'object' || value === null) return value;
    return Object.fromEntries(
      Object.entries(value).map(([key, inner]) => [
        key,
        typeof inner === 'string' && ['url', '@id', 'logo', 'inDefinedTermSet', 'image'].includes(key) && inner.startsWith('/')
          ? `${this.origin}${inner}`
          : this.absolute(inner),
      ]),
    );
  }

  private arrivedOrigin(): string {
    const arrived = this.document.head.querySelector('link[rel=canonical]')?.getAttribute('href');
    return new URL(arrived ?? this.document.location.href).origin;
  }
}
