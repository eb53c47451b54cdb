/** Every route of the interface once; the document, the page about it and the tests follow from this list. */

import { RULER_FORMAT } from '../answers/ask-ruler'
import { FIGURE_FORMATS } from '../answers/figure'
import { QR_FORMATS } from '../answers/qr'
import { FORMATS } from '../formats'
import {
  AT_PARAMETERS,
  FIGURE_PARAMETERS,
  OEMBED_PARAMETERS,
  QR_PARAMETERS,
  RULER_FORMATS,
  SCENARIOS,
  TABLE_PARAMETERS,
} from './parameters'
import { BYTES, type Route } from './route'
import { RULER_PARAMETERS } from './ruler'
import { refTo } from './shapes'

const JSON_TYPE = 'application/json'
export const LINES_TYPE = 'application/x-ndjson'

const tablesIn = (formats: typeof FORMATS, json: string) =>
  Object.fromEntries(
    formats.map(({ key, mediaType }) => [mediaType.split(';')[0], key === 'json' ? refTo(json) : BYTES]),
  )

export const ROUTES: readonly Route[] = [
  {
    path: '/api/history',
    method: 'get',
    summary: 'Whole histories: origin, end with its reason, measures with error bounds, moments, a series to draw.',
    parameters: [SCENARIOS],
    answer: { [JSON_TYPE]: refTo('Histories') },
    refusals: [422],
    examples: [
      { title: 'Age, horizons and ending of one scenario', query: 's=h0:70,matter:0.3' },
      {
        title: 'Two scenarios, one of which ends in a rip',
        query: 's=h0:70,matter:0.3&s=h0:70,matter:0.3,eos:constant,w:-1.2',
      },
    ],
  },
  {
    path: '/api/at',
    method: 'get',
    summary: 'All columns at given redshifts, scale factors, times or ages.',
    parameters: [SCENARIOS, ...AT_PARAMETERS],
    answer: { [JSON_TYPE]: refTo('Epochs') },
    refusals: [422],
    examples: [
      { title: 'Distances at three redshifts', query: 's=h0:70,matter:0.3&z=0.5,1,2&columns=age,comoving,luminosity' },
      { title: 'A time ahead', query: 's=h0:70,matter:0.3&time=10&columns=scale,hubble,eventHorizon' },
    ],
  },
  {
    path: '/api/table',
    method: 'get',
    summary: 'Evenly spaced rows as a file, streamed.',
    parameters: [SCENARIOS, ...TABLE_PARAMETERS],
    answer: tablesIn(FORMATS, 'Table'),
    refusals: [422],
    examples: [
      { title: 'A table for a spreadsheet', query: 's=h0:70,matter:0.3&by=redshift&from=0&to=10&rows=11' },
      {
        title: 'The same for a paper',
        query: 's=h0:70,matter:0.3&by=redshift&from=0&to=10&rows=11&format=latex&columns=redshift,age,luminosity',
      },
      { title: 'And as data', query: 's=h0:70,matter:0.3&rows=3&format=json&columns=scale,age' },
    ],
  },
  {
    path: '/api/ruler',
    method: 'get',
    summary: 'What an epoch means in every scenario, and what lies between two, rounded as the page shows it.',
    parameters: [SCENARIOS, ...RULER_PARAMETERS],
    answer: { [JSON_TYPE]: refTo('Ruler') },
    refusals: [],
    examples: [
      { title: 'A lens and its source', query: 's=h0:70,matter:0.3&at=0.5&until=2&read=age,angular' },
      {
        title: 'When the background is at 10 K',
        query: 's=h0:70,matter:0.3&epoch=temperature&at=10&read=redshift,age',
      },
    ],
  },
  {
    path: '/api/ruler/table',
    method: 'get',
    summary: 'The same in full, a row for each scenario.',
    parameters: [SCENARIOS, ...RULER_PARAMETERS, ...RULER_FORMATS],
    answer: tablesIn(RULER_FORMAT.formats, 'RulerTable'),
    refusals: [422],
    examples: [
      {
        title: 'The angle of 30 kpc in two scenarios',
        query: 's=h0:70,matter:0.3&s=h0:67.66&at=2&length=0.03&read=angle,angular&format=json',
      },
    ],
  },
  {
    path: '/api/neighbours',
    method: 'get',
    summary:
      'For each number of a scenario the smallest change up or down that makes another origin or ending of it, with what it becomes. All other numbers stay, and one density closes the budget.',
    parameters: [SCENARIOS],
    answer: { [JSON_TYPE]: refTo('Neighbourhoods') },
    refusals: [422],
    examples: [{ title: 'How far the standard model is from a crunch', query: 's=h0:70,matter:0.3' }],
  },
  {
    path: '/api/batch',
    method: 'post',
    summary:
      'A history for each line of the body, in the same order, streamed. Up to 10,000 lines; a line at fault gives a problem and does not stop the rest.',
    parameters: [],
    body: { [LINES_TYPE]: refTo('BatchLine') },
    answer: { [LINES_TYPE]: refTo('BatchResult') },
    refusals: [413, 415],
    examples: [
      {
        title: 'Three scenarios, one of them at fault',
        body: '"h0:70,matter:0.3"\n"h0:70,matter:-1"\n{"s": "h0:60"}\n',
      },
    ],
  },
  {
    path: '/api/figure',
    method: 'get',
    summary: 'A figure as a file for a place: slide, journal, poster or preview card.',
    parameters: [SCENARIOS, ...FIGURE_PARAMETERS],
    answer: Object.fromEntries(FIGURE_FORMATS.map(({ mediaType }) => [mediaType, BYTES])),
    refusals: [422],
    examples: [
      { title: 'For a column of a journal, with embedded fonts', query: 's=h0:70,matter:0.3&format=pdf&size=column' },
      { title: 'For a slide on a dark ground', query: 's=h0:70,matter:0.3&format=png&size=slide&theme=night' },
    ],
  },
  {
    path: '/api/words',
    method: 'get',
    summary:
      'Caption, alternative text, methods, summary in plain language, press card, LaTeX macros and BibTeX, with numbers rounded to what is known.',
    parameters: [SCENARIOS],
    answer: { [JSON_TYPE]: refTo('Words') },
    refusals: [422],
    examples: [{ title: 'Words for one scenario', query: 's=h0:70,matter:0.3' }],
  },
  {
    path: '/api/qr',
    method: 'get',
    summary: 'The link of scenarios as a QR code. A link of more characters than a code holds is refused.',
    parameters: [SCENARIOS, ...QR_PARAMETERS],
    answer: Object.fromEntries(QR_FORMATS.map(({ mediaType }) => [mediaType, BYTES])),
    refusals: [],
    examples: [{ title: 'For the last slide', query: 's=h0:70,matter:0.3&base=https://a.example' }],
  },
  {
    path: '/api/oembed',
    method: 'get',
    summary:
      'How a site that is given a link of ours shows it (oEmbed 1.0); only where the server knows its own address.',
    parameters: OEMBED_PARAMETERS,
    answer: { [JSON_TYPE]: refTo('OEmbed') },
    refusals: [],
    examples: [],
  },
]
