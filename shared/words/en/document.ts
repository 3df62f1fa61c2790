import type { DocumentFault } from '../../model/document-faults';

/** One sentence: what is wrong with the document, and what to do. */
export function faultSentence(fault: DocumentFault): string {
  const { code, data } = fault;
  switch (code) {
    case 'off-grid':
      return `A mat is not on the page's grid of ${data.columns} × ${data.rows} whole steps: move it onto the page, or make it smaller.`;
    case 'overlap':
      return 'Two mats overlap: move one of them, or mark one as laid over.';
    case 'page-missing':
      return `A mat is on the ${data.page} page, which this spread does not have: move it to the other page.`;
    case 'duplicate-id':
      return `Two things in the spread have the same id (${data.id}): give one of them a new one.`;
    case 'unknown-print':
      return `There is no print ${data.printId} in this studio: take it off the spread, or upload it first.`;
    case 'print-listed-twice':
      return `The table lists the print ${data.printId} twice: leave one of them out.`;
    case 'true-size-too-large':
      return "A mat's true size is larger than its place on the grid: choose a smaller size, or give the mat more steps.";
    case 'no-room-for-photo':
      return 'The reveal leaves no room for a photo on a mat: make the reveal thinner, or the mat larger.';
    case 'no-room-for-inner-mat':
      return 'The reveal leaves no room for an inner mat: make the reveal thinner, or the mat larger.';
    case 'pane-too-few':
      return 'A split print needs two panes or more: add a mat to the group, or ungroup it.';
    case 'pane-member-missing':
      return 'A group of panes names a mat that is not on the spread: take it out of the group.';
    case 'pane-two-pages':
      return 'The panes of a split print are on both pages: move them all to one page.';
    case 'pane-content-differs':
      return 'A mat in a group of panes does not carry a pane of that group: make it a pane, or take it out of the group.';
    case 'pane-in-two-groups':
      return 'A mat belongs to two groups of panes: take it out of one of them.';
    case 'pane-without-group':
      return 'A mat is a pane, but no group of panes names it: add it to its group, or make it bare.';
    case 'out-of-order':
      return 'The mats are not in drawing order: sort them by z, then by id.';
    case 'too-many-mats':
      return `A spread holds at most ${data.max} mats, and this one has ${data.count}: delete some.`;
    case 'document-too-large':
      return `A spread holds at most ${Math.floor(Number(data.max) / 1024)} kB, and this one has ${Math.ceil(Number(data.bytes) / 1024)} kB: shorten its journaling or delete mats.`;
  }
}
