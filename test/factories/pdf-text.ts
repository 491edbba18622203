import { inflateSync } from 'node:zlib';

/**
 * The texts of a PDF that pdfkit wrote, page by page, each as it was set. Reads the structure of
 * ISO 32000-1 as far as such a file has it: objects, compressed streams, `ToUnicode` maps.
 */
export function pdfPages(bytes: Uint8Array): string[][] {
  const file = Buffer.from(bytes).toString('latin1');
  const objects = new Map<string, { dictionary: string; stream: string }>();
  for (const match of file.matchAll(/(?:^|\n)(\d+) 0 obj\n/g)) {
    const start = match.index + match[0].length;
    const end = file.indexOf('\nendobj', start);
    const body = file.slice(start, end);
    const at = body.indexOf('stream\n');
    const dictionary = at < 0 ? body : body.slice(0, at);
    const length = Number(/\/Length (\d+)/.exec(dictionary)?.[1] ?? 0);
    const raw = at < 0 ? '' : file.slice(start + at + 'stream\n'.length, start + at + 'stream\n'.length + length);
    const stream = dictionary.includes('/FlateDecode') ? inflateSync(Buffer.from(raw, 'latin1')).toString('latin1') : raw;
    objects.set(match[1]!, { dictionary, stream });
  }
  const object = (id: string | undefined) => {
    const found = objects.get(id ?? '');
    if (!found) throw new Error(`the PDF has no object ${id}`);
    return found;
  };
  const kids = [...objects.values()].find(({ dictionary }) => /\/Type \/Pages\b/.test(dictionary))?.dictionary ?? '';
  const pages = [...(/\/Kids \[([^\]]*)\]/.exec(kids)?.[1] ?? '').matchAll(/(\d+) 0 R/g)].map(([, id]) => object(id).dictionary);
  return pages.map((page) => {
    const resources = object(/\/Resources (\d+) 0 R/.exec(page)?.[1]).dictionary;
    const fonts = new Map<string, string[]>();
    for (const [, name, id] of (/\/Font <<([^>]*)>>/.exec(resources)?.[1] ?? '').matchAll(/\/(F\d+) (\d+) 0 R/g)) {
      fonts.set(name!, lettersOf(object(/\/ToUnicode (\d+) 0 R/.exec(object(id).dictionary)?.[1]).stream));
    }
    return textsOf(object(/\/Contents (\d+) 0 R/.exec(page)?.[1]).stream, fonts);
  });
}

/** What each glyph of a font means, from its `bfrange` arrays. */
function lettersOf(map: string): string[] {
  const letters: string[] = [];
  for (const [, from, list] of map.matchAll(/<([0-9a-f]{4})> <[0-9a-f]{4}> \[([^\]]*)\]/gi)) {
    for (const [i, [, hex]] of [...(list ?? '').matchAll(/<([0-9a-f ]*)>/gi)].entries()) {
      letters[parseInt(from!, 16) + i] = Buffer.from(hex!.replaceAll(' ', ''), 'hex').swap16().toString('utf16le');
    }
  }
  return letters;
}

function textsOf(content: string, fonts: Map<string, string[]>): string[] {
  return [...content.matchAll(/BT\n([\s\S]*?)ET/g)].map(([, block]) => {
    const letters = fonts.get(/\/(F\d+) [\d.]+ Tf/.exec(block!)?.[1] ?? '') ?? [];
    const shown = [...block!.matchAll(/\[([^\]]*)\] TJ/g)].flatMap(([, array]) =>
      [...array!.matchAll(/<([0-9a-f]*)>/gi)].map(([, hex]) => hex!),
    );
    return (shown.join('').match(/.{4}/g) ?? []).map((glyph) => letters[parseInt(glyph, 16)] ?? '').join('');
  });
}
