import axe from 'axe-core';

/** What axe finds wrong with what is on the page; colours and whole-page rules need a browser. */
export async function axeFaults(element: Element = document.body): Promise<string[]> {
  const { violations } = await axe.run(element, {
    rules: {
      'color-contrast': { enabled: false },
      'page-has-heading-one': { enabled: false },
      region: { enabled: false },
    },
  });
  return violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' ')}`);
}
