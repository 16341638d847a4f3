// What the tests use of jsdom, which has no types of its own here.
declare module "jsdom" {
  export interface DomElement {
    readonly id: string;
    readonly tagName: string;
    readonly textContent: string;
    readonly children: ArrayLike<DomElement>;
    readonly caption?: DomElement | null;
    readonly getAttribute: (name: string) => string | null;
    readonly getAttributeNames: () => readonly string[];
    readonly querySelector: (query: string) => DomElement | null;
    readonly querySelectorAll: (query: string) => Iterable<DomElement> & { readonly length: number };
  }
  export interface DomDocument extends Pick<DomElement, "querySelector" | "querySelectorAll"> {
    readonly title: string;
    readonly documentElement: DomElement & { readonly lang: string };
  }
  export class JSDOM {
    constructor(html: string, options?: { readonly runScripts?: "outside-only" });
    readonly window: { readonly document: DomDocument; readonly eval: (script: string) => unknown };
  }
}
