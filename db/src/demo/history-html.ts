import type { DemoCalendar } from './calendar.js';
import type { DemoCase } from './demo-case.js';

/** The history as rich text: what happened, what was tried, medicines, allergies and a dated list. */
export function historyHtml(story: DemoCase, calendar: DemoCalendar): string {
  return [
    ...story.history.map(paragraph),
    heading('Tried so far'),
    paragraph(capital(`${story.tried}.`)),
    heading('Red flags'),
    list(story.redFlags.map(capital)),
    heading('Medicines'),
    list(story.medicines),
    heading('Allergies'),
    list(story.allergies),
    heading('Life'),
    paragraph(`${capital(story.occupation)}. Lives with ${story.livesWith}.`),
    heading('What the patient wants to know'),
    paragraph(story.wantsToKnow),
    heading('Timeline'),
    list(story.timeline.map((entry) => `${calendar.day(entry.on)}: ${entry.what}`)),
  ].join('');
}

const escape = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
const paragraph = (text: string): string => `<p>${escape(text)}</p>`;
const heading = (text: string): string => `<h3>${escape(text)}</h3>`;
const list = (items: string[]): string =>
  `<ul>${items.map((item) => `<li>${paragraph(item)}</li>`).join('')}</ul>`;
const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
