/**
 * The interface of Longhence in types, as /api/openapi.json has it: `Routes['/api/at']['answers']['application/json']`.
 * Made by `npm run client-types`.
 */

/**
 * A scenario code as plain text, nothing percent-encoded
 */
export type BatchLine =
  | string
  | {
      s: string
    }
export type BatchResult =
  | {
      /**
       * The line of the request, counted from 0
       */
      index: number
      /**
       * The canonical scenario code, ready to stand in an address
       */
      code: string
      label: string
      /**
       * Ω today; the sum is 1
       */
      densities: {
        photons: number
        masslessNeutrinos: number
        massiveNeutrinos: number
        coldMatter: number
        curvature: number
        dark: number
      }
      origin: {
        /**
         * big-bang: a = 0 at a finite time; bounce: contraction before expansion; eternal: a → 0 only as t → −∞; static: emerges from a static state; oscillating: the last of many bounces; singular: the density diverges at a finite a
         */
        kind: 'big-bang' | 'bounce' | 'eternal' | 'static' | 'oscillating' | 'singular'
        /**
         * Gyr from now; null when infinite
         */
        time: number | null
        scale: number
      }
      end: {
        kind:
          | 'crunch'
          | 'rip'
          | 'little-rip'
          | 'exponential'
          | 'accelerating'
          | 'coasting'
          | 'decelerating'
          | 'static'
          | 'singular'
          | 'oscillating'
        /**
         * Gyr from now; null when infinite
         */
        time: number | null
        /**
         * Limit of a; null when infinite
         */
        scale: number | null
        turnaround: {
          time: number
          scale: number
        } | null
        proven: boolean
        because: string
      }
      measures: {
        /**
         * age: Time since the origin: the Big Bang, or the bounce.
         */
        age:
          | {
              value: number
              unit: 'Gyr'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'Gyr'
              error: null
              because: string
            }
        /**
         * Hubble time: The age that a universe of constant expansion speed would have.
         */
        hubbleTime:
          | {
              value: number
              unit: 'Gyr'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'Gyr'
              error: null
              because: string
            }
        /**
         * Hubble radius: Proper distance at which recession today equals the speed of light.
         */
        hubbleRadius:
          | {
              value: number
              unit: 'Gly'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'Gly'
              error: null
              because: string
            }
        /**
         * particle horizon: Comoving distance to the farthest matter whose light can have reached us.
         */
        particleHorizon:
          | {
              value: number
              unit: 'Gly'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'Gly'
              error: null
              because: string
            }
        /**
         * event horizon: Comoving distance that light sent today can cover before the end: what can still be reached.
         */
        eventHorizon:
          | {
              value: number
              unit: 'Gly'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'Gly'
              error: null
              because: string
            }
        /**
         * light sent today reaches: Redshift of the farthest galaxies that a signal sent today can ever reach.
         */
        reachRedshift:
          | {
              value: number
              unit: ''
              error: number
              because: null
            }
          | {
              value: null
              unit: ''
              error: null
              because: string
            }
        /**
         * recession at c: Redshift beyond which galaxies recede faster than light today.
         */
        superluminalRedshift:
          | {
              value: number
              unit: ''
              error: number
              because: null
            }
          | {
              value: null
              unit: ''
              error: null
              because: string
            }
        /**
         * ever visible: Comoving distance to the farthest matter that will ever be seen from here.
         */
        futureVisibility:
          | {
              value: number
              unit: 'Gly'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'Gly'
              error: null
              because: string
            }
        /**
         * deceleration: Deceleration parameter today; negative while the expansion accelerates.
         */
        deceleration:
          | {
              value: number
              unit: ''
              error: number
              because: null
            }
          | {
              value: null
              unit: ''
              error: null
              because: string
            }
        /**
         * jerk: Third derivative of the scale factor today; 1 for matter and a cosmological constant in flat space.
         */
        jerk:
          | {
              value: number
              unit: ''
              error: number
              because: null
            }
          | {
              value: null
              unit: ''
              error: null
              because: string
            }
        /**
         * acceleration begins: Redshift of the last change from deceleration to acceleration, or of the first one ahead (then negative).
         */
        accelerationOnset:
          | {
              value: number
              unit: ''
              error: number
              because: null
            }
          | {
              value: null
              unit: ''
              error: null
              because: string
            }
        /**
         * matter equals radiation: Redshift at which cold matter equals photons and all neutrinos.
         */
        equalityMatterRadiation:
          | {
              value: number
              unit: ''
              error: number
              because: null
            }
          | {
              value: null
              unit: ''
              error: null
              because: string
            }
        /**
         * matter equals dark energy: Redshift at which cold matter equals dark energy.
         */
        equalityMatterDark:
          | {
              value: number
              unit: ''
              error: number
              because: null
            }
          | {
              value: null
              unit: ''
              error: null
              because: string
            }
        /**
         * radius of curvature: Radius of curvature of space today.
         */
        curvatureRadius:
          | {
              value: number
              unit: 'Gly'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'Gly'
              error: null
              because: string
            }
        /**
         * last scattering: Redshift at which photons were last scattered.
         */
        recombinationRedshift:
          | {
              value: number
              unit: ''
              error: number
              because: null
            }
          | {
              value: null
              unit: ''
              error: null
              because: string
            }
        /**
         * end of the drag epoch: Redshift at which baryons were released from the photons.
         */
        dragRedshift:
          | {
              value: number
              unit: ''
              error: number
              because: null
            }
          | {
              value: null
              unit: ''
              error: null
              because: string
            }
        /**
         * sound horizon at drag: Comoving distance that sound covered until the end of the drag epoch.
         */
        soundHorizonDrag:
          | {
              value: number
              unit: 'Mpc'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'Mpc'
              error: null
              because: string
            }
        /**
         * acoustic angle: Angle under which the sound horizon at last scattering is seen.
         */
        acousticAngle:
          | {
              value: number
              unit: 'rad'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'rad'
              error: null
              because: string
            }
        /**
         * final expansion rate: What H tends to when the universe expands for ever.
         */
        asymptoticHubble:
          | {
              value: number
              unit: 'km/s/Mpc'
              error: number
              because: null
            }
          | {
              value: null
              unit: 'km/s/Mpc'
              error: null
              because: string
            }
      }
      moments: {
        kind:
          | 'origin'
          | 'matter-radiation-equality'
          | 'recombination'
          | 'drag'
          | 'acceleration-start'
          | 'acceleration-end'
          | 'matter-dark-equality'
          | 'now'
          | 'turnaround'
          | 'unbinding-cluster'
          | 'unbinding-galaxy'
          | 'unbinding-planet'
          | 'unbinding-earth'
          | 'unbinding-atom'
          | 'end'
        label: string
        time: number | null
        scale: number | null
        redshift: number | null
        /**
         * Gyr since the origin; null when infinite
         */
        age: number | null
        /**
         * Gyr left to the end; null when infinite
         */
        remaining: number | null
      }[]
      /**
       * Rounded points for drawing
       */
      series: {
        columns: {
          name: string
          unit: string
          label: string
        }[]
        rows: number[][]
      }
    }
  | {
      /**
       * The line of the request, counted from 0
       */
      index: number
      problem: Problem
    }

export interface Routes {
  /**
   * Whole histories: origin, end with its reason, measures with error bounds, moments, a series to draw.
   */
  '/api/history': {
    query: {
      /**
       * A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.
       *
       * @minItems 1
       * @maxItems 6
       */
      s?: string[]
    }
    answers: {
      'application/json': Histories
    }
  }
  /**
   * All columns at given redshifts, scale factors, times or ages.
   */
  '/api/at': {
    query: {
      /**
       * A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.
       *
       * @minItems 1
       * @maxItems 6
       */
      s?: string[]
      /**
       * Redshifts.
       */
      z?: string
      /**
       * Scale factors.
       */
      scale?: string
      /**
       * Times from now; the past is negative.
       */
      time?: string
      /**
       * Times since the origin; negative before a bounce.
       */
      age?: string
      /**
       * With z or scale: the expansion that holds today, or the contraction.
       */
      branch?: 'expanding' | 'contracting'
      /**
       * The columns, in the order asked; all where none are asked.
       */
      columns?: string
      /**
       * With 1, each column is followed by one of the absolute bounds on its numerical errors, named with Error at its end.
       */
      bounds?: '0' | '1'
    }
    answers: {
      'application/json': Epochs
    }
  }
  /**
   * Evenly spaced rows as a file, streamed.
   */
  '/api/table': {
    query: {
      /**
       * A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.
       *
       * @minItems 1
       * @maxItems 6
       */
      s?: string[]
      /**
       * The format of the download.
       */
      format?: 'csv' | 'json' | 'votable' | 'latex'
      /**
       * logscale: Equal steps in ln a, from a = 0.001 to a = 1. scale: Equal steps in a, from one step above 0 to a = 1. time: Equal steps in time (Gyr from now), from one step after the origin, or three Hubble times ago where there is none, to now. redshift: Equal steps in z, from 0 to 10.
       */
      by?: 'logscale' | 'scale' | 'time' | 'redshift'
      /**
       * Where the rows begin, in the variable of `by`.
       */
      from?: number
      /**
       * Where they end, in the variable of `by`; it is the last row.
       */
      to?: number
      /**
       * How many rows; 200 where none are asked.
       */
      rows?: number
      /**
       * The columns, in the order asked; all where none are asked.
       */
      columns?: string
      /**
       * With 1, each column is followed by one of the absolute bounds on its numerical errors, named with Error at its end.
       */
      bounds?: '0' | '1'
    }
    answers: {
      'text/csv': string
      'application/json': Table
      'application/x-votable+xml': string
      'text/x-tex': string
    }
  }
  /**
   * What an epoch means in every scenario, and what lies between two, rounded as the page shows it.
   */
  '/api/ruler': {
    query: {
      /**
       * A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.
       *
       * @minItems 1
       * @maxItems 6
       */
      s?: string[]
      /**
       * What epochs are given by: z, scale, time Gyr, age Gyr, lookback Gyr, temperature K, comoving Mpc.
       */
      epoch?: 'z' | 'scale' | 'time' | 'age' | 'lookback' | 'temperature' | 'comoving'
      /**
       * The epoch.
       */
      at?: string
      /**
       * Another epoch, for what lies between the two.
       */
      until?: string
      /**
       * What is read: some of time, age, lookback, scale, redshift, hubble, deceleration, jerk, omegaMatter, omegaRadiation, omegaNeutrino, omegaCurvature, omegaDark, w, comoving, transverse, angular, luminosity, modulus, arcsecond, volume, conformal, particleHorizon, eventHorizon, hubbleRadius, temperature, criticalDensity, drift, growth, growthRate, recession, recessionNow, recessionThen, angle, comovingAngle, observedLine, skyVolume, volumeElement, joined by commas.
       */
      read?: string
      /**
       * A length in Mpc, of which angle and comovingAngle tell the angle.
       */
      length?: string
      /**
       * Where observedLine is emitted: a wavelength or frequency with one of Å, nm, µm, mm, cm, m, MHz, GHz.
       */
      line?: string
      /**
       * Square degrees of the sky, for skyVolume.
       */
      sky?: string
      /**
       * With h, lengths are in units with h⁻¹.
       */
      units?: 'h'
    }
    answers: {
      'application/json': Ruler
    }
  }
  /**
   * The same in full, a row for each scenario.
   */
  '/api/ruler/table': {
    query: {
      /**
       * A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.
       *
       * @minItems 1
       * @maxItems 6
       */
      s?: string[]
      /**
       * What epochs are given by: z, scale, time Gyr, age Gyr, lookback Gyr, temperature K, comoving Mpc.
       */
      epoch?: 'z' | 'scale' | 'time' | 'age' | 'lookback' | 'temperature' | 'comoving'
      /**
       * The epoch.
       */
      at?: string
      /**
       * Another epoch, for what lies between the two.
       */
      until?: string
      /**
       * What is read: some of time, age, lookback, scale, redshift, hubble, deceleration, jerk, omegaMatter, omegaRadiation, omegaNeutrino, omegaCurvature, omegaDark, w, comoving, transverse, angular, luminosity, modulus, arcsecond, volume, conformal, particleHorizon, eventHorizon, hubbleRadius, temperature, criticalDensity, drift, growth, growthRate, recession, recessionNow, recessionThen, angle, comovingAngle, observedLine, skyVolume, volumeElement, joined by commas.
       */
      read?: string
      /**
       * A length in Mpc, of which angle and comovingAngle tell the angle.
       */
      length?: string
      /**
       * Where observedLine is emitted: a wavelength or frequency with one of Å, nm, µm, mm, cm, m, MHz, GHz.
       */
      line?: string
      /**
       * Square degrees of the sky, for skyVolume.
       */
      sky?: string
      /**
       * With h, lengths are in units with h⁻¹.
       */
      units?: 'h'
      /**
       * The format of the download.
       */
      format?: 'csv' | 'json'
    }
    answers: {
      'text/csv': string
      'application/json': RulerTable
    }
  }
  /**
   * For each number of a scenario the smallest change up or down that makes another origin or ending of it, with what it becomes. All other numbers stay, and one density closes the budget.
   */
  '/api/neighbours': {
    query: {
      /**
       * A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.
       *
       * @minItems 1
       * @maxItems 6
       */
      s?: string[]
    }
    answers: {
      'application/json': Neighbourhoods
    }
  }
  /**
   * A history for each line of the body, in the same order, streamed. Up to 10,000 lines; a line at fault gives a problem and does not stop the rest.
   */
  '/api/batch': {
    query: {}
    body: {
      'application/x-ndjson': BatchLine
    }
    answers: {
      'application/x-ndjson': BatchResult
    }
  }
  /**
   * A figure as a file for a place: slide, journal, poster or preview card.
   */
  '/api/figure': {
    query: {
      /**
       * A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.
       *
       * @minItems 1
       * @maxItems 6
       */
      s?: string[]
      /**
       * What is drawn. long: scale factor against time. reach: Reach, with show one of proper, comoving, conformal. contents: Contents, with show one of shares, w. rate: Rate, with show one of pace, q. distances: Distances, with show one of comoving, transverse, luminosity, angular, modulus, volume, lookback.
       */
      view?: 'long' | 'reach' | 'contents' | 'rate' | 'distances'
      /**
       * The format of the file.
       */
      format?: 'svg' | 'png' | 'pdf'
      /**
       * slide: slide 16:9 (Advice for slides: 18 points at least (common practice); 13.333 × 7.5 inches). column: journal, one column (88 mm: Astronomy & Astrophysics, author pages; 6 points: common practice (Nature’s guide allows 5)). two-columns: journal, two columns (180 mm: Astronomy & Astrophysics, author pages; 6 points: common practice (Nature’s guide allows 5)). poster: poster (24 points: common practice). card: preview card (1200 × 630 pixels at 96 dots an inch; 14 points: tuned by eye).
       */
      size?: 'slide' | 'column' | 'two-columns' | 'poster' | 'card'
      /**
       * Dark on light, or light on dark.
       */
      theme?: 'paper' | 'night'
      /**
       * The scenario that comparisons refer to, counted from 1.
       */
      focus?: number
      /**
       * Of the long view: time in logarithmic steps away from now.
       */
      time?: 'log'
      /**
       * Of the long view: where it begins, in Gyr from now.
       */
      from?: number
      /**
       * Of the long view: where it ends, in Gyr from now.
       */
      to?: number
      /**
       * Of the other views: what they show.
       */
      show?: string
      /**
       * Of the other views: the horizontal axis, time, logtime, lookback, scale, logscale, redshift, logredshift, conformal.
       */
      by?: string
      /**
       * Of the other views: over the scenario in focus, or less it.
       */
      compare?: 'ratio' | 'difference'
      /**
       * Of the view reach: redshift of the galaxy that is followed.
       */
      galaxy?: number
      /**
       * Of the other views: where the axis begins, in its own unit.
       */
      left?: number
      /**
       * Of the other views: where the axis ends, in its own unit.
       */
      right?: number
      /**
       * Dots an inch of a PNG of at most 40 megapixels.
       */
      dpi?: number
    }
    answers: {
      'image/svg+xml': string
      'image/png': string
      'application/pdf': string
    }
  }
  /**
   * Caption, alternative text, methods, summary in plain language, press card, LaTeX macros and BibTeX, with numbers rounded to what is known.
   */
  '/api/words': {
    query: {
      /**
       * A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.
       *
       * @minItems 1
       * @maxItems 6
       */
      s?: string[]
    }
    answers: {
      'application/json': Words
    }
  }
  /**
   * The link of scenarios as a QR code. A link of more characters than a code holds is refused.
   */
  '/api/qr': {
    query: {
      /**
       * A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.
       *
       * @minItems 1
       * @maxItems 6
       */
      s?: string[]
      /**
       * The format of the file.
       */
      format?: 'svg' | 'png'
      /**
       * Where the link leads: the address of a site. Needed where the server does not know its own.
       */
      base?: string
    }
    answers: {
      'image/svg+xml': string
      'image/png': string
    }
  }
  /**
   * How a site that is given a link of ours shows it (oEmbed 1.0); only where the server knows its own address.
   */
  '/api/oembed': {
    query: {
      /**
       * A link of this site.
       */
      url?: string
      /**
       * Pixels that the frame may be wide.
       */
      maxwidth?: number
      /**
       * Pixels that the frame may be high.
       */
      maxheight?: number
      /**
       * The format of the answer.
       */
      format?: 'json'
    }
    answers: {
      'application/json': OEmbed
    }
  }
}
export interface Histories {
  engine: string
  scenarios: History[]
}
export interface History {
  /**
   * The canonical scenario code, ready to stand in an address
   */
  code: string
  label: string
  /**
   * Ω today; the sum is 1
   */
  densities: {
    photons: number
    masslessNeutrinos: number
    massiveNeutrinos: number
    coldMatter: number
    curvature: number
    dark: number
  }
  origin: {
    /**
     * big-bang: a = 0 at a finite time; bounce: contraction before expansion; eternal: a → 0 only as t → −∞; static: emerges from a static state; oscillating: the last of many bounces; singular: the density diverges at a finite a
     */
    kind: 'big-bang' | 'bounce' | 'eternal' | 'static' | 'oscillating' | 'singular'
    /**
     * Gyr from now; null when infinite
     */
    time: number | null
    scale: number
  }
  end: {
    kind:
      | 'crunch'
      | 'rip'
      | 'little-rip'
      | 'exponential'
      | 'accelerating'
      | 'coasting'
      | 'decelerating'
      | 'static'
      | 'singular'
      | 'oscillating'
    /**
     * Gyr from now; null when infinite
     */
    time: number | null
    /**
     * Limit of a; null when infinite
     */
    scale: number | null
    turnaround: {
      time: number
      scale: number
    } | null
    proven: boolean
    because: string
  }
  measures: {
    /**
     * age: Time since the origin: the Big Bang, or the bounce.
     */
    age:
      | {
          value: number
          unit: 'Gyr'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'Gyr'
          error: null
          because: string
        }
    /**
     * Hubble time: The age that a universe of constant expansion speed would have.
     */
    hubbleTime:
      | {
          value: number
          unit: 'Gyr'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'Gyr'
          error: null
          because: string
        }
    /**
     * Hubble radius: Proper distance at which recession today equals the speed of light.
     */
    hubbleRadius:
      | {
          value: number
          unit: 'Gly'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'Gly'
          error: null
          because: string
        }
    /**
     * particle horizon: Comoving distance to the farthest matter whose light can have reached us.
     */
    particleHorizon:
      | {
          value: number
          unit: 'Gly'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'Gly'
          error: null
          because: string
        }
    /**
     * event horizon: Comoving distance that light sent today can cover before the end: what can still be reached.
     */
    eventHorizon:
      | {
          value: number
          unit: 'Gly'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'Gly'
          error: null
          because: string
        }
    /**
     * light sent today reaches: Redshift of the farthest galaxies that a signal sent today can ever reach.
     */
    reachRedshift:
      | {
          value: number
          unit: ''
          error: number
          because: null
        }
      | {
          value: null
          unit: ''
          error: null
          because: string
        }
    /**
     * recession at c: Redshift beyond which galaxies recede faster than light today.
     */
    superluminalRedshift:
      | {
          value: number
          unit: ''
          error: number
          because: null
        }
      | {
          value: null
          unit: ''
          error: null
          because: string
        }
    /**
     * ever visible: Comoving distance to the farthest matter that will ever be seen from here.
     */
    futureVisibility:
      | {
          value: number
          unit: 'Gly'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'Gly'
          error: null
          because: string
        }
    /**
     * deceleration: Deceleration parameter today; negative while the expansion accelerates.
     */
    deceleration:
      | {
          value: number
          unit: ''
          error: number
          because: null
        }
      | {
          value: null
          unit: ''
          error: null
          because: string
        }
    /**
     * jerk: Third derivative of the scale factor today; 1 for matter and a cosmological constant in flat space.
     */
    jerk:
      | {
          value: number
          unit: ''
          error: number
          because: null
        }
      | {
          value: null
          unit: ''
          error: null
          because: string
        }
    /**
     * acceleration begins: Redshift of the last change from deceleration to acceleration, or of the first one ahead (then negative).
     */
    accelerationOnset:
      | {
          value: number
          unit: ''
          error: number
          because: null
        }
      | {
          value: null
          unit: ''
          error: null
          because: string
        }
    /**
     * matter equals radiation: Redshift at which cold matter equals photons and all neutrinos.
     */
    equalityMatterRadiation:
      | {
          value: number
          unit: ''
          error: number
          because: null
        }
      | {
          value: null
          unit: ''
          error: null
          because: string
        }
    /**
     * matter equals dark energy: Redshift at which cold matter equals dark energy.
     */
    equalityMatterDark:
      | {
          value: number
          unit: ''
          error: number
          because: null
        }
      | {
          value: null
          unit: ''
          error: null
          because: string
        }
    /**
     * radius of curvature: Radius of curvature of space today.
     */
    curvatureRadius:
      | {
          value: number
          unit: 'Gly'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'Gly'
          error: null
          because: string
        }
    /**
     * last scattering: Redshift at which photons were last scattered.
     */
    recombinationRedshift:
      | {
          value: number
          unit: ''
          error: number
          because: null
        }
      | {
          value: null
          unit: ''
          error: null
          because: string
        }
    /**
     * end of the drag epoch: Redshift at which baryons were released from the photons.
     */
    dragRedshift:
      | {
          value: number
          unit: ''
          error: number
          because: null
        }
      | {
          value: null
          unit: ''
          error: null
          because: string
        }
    /**
     * sound horizon at drag: Comoving distance that sound covered until the end of the drag epoch.
     */
    soundHorizonDrag:
      | {
          value: number
          unit: 'Mpc'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'Mpc'
          error: null
          because: string
        }
    /**
     * acoustic angle: Angle under which the sound horizon at last scattering is seen.
     */
    acousticAngle:
      | {
          value: number
          unit: 'rad'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'rad'
          error: null
          because: string
        }
    /**
     * final expansion rate: What H tends to when the universe expands for ever.
     */
    asymptoticHubble:
      | {
          value: number
          unit: 'km/s/Mpc'
          error: number
          because: null
        }
      | {
          value: null
          unit: 'km/s/Mpc'
          error: null
          because: string
        }
  }
  moments: {
    kind:
      | 'origin'
      | 'matter-radiation-equality'
      | 'recombination'
      | 'drag'
      | 'acceleration-start'
      | 'acceleration-end'
      | 'matter-dark-equality'
      | 'now'
      | 'turnaround'
      | 'unbinding-cluster'
      | 'unbinding-galaxy'
      | 'unbinding-planet'
      | 'unbinding-earth'
      | 'unbinding-atom'
      | 'end'
    label: string
    time: number | null
    scale: number | null
    redshift: number | null
    /**
     * Gyr since the origin; null when infinite
     */
    age: number | null
    /**
     * Gyr left to the end; null when infinite
     */
    remaining: number | null
  }[]
  /**
   * Rounded points for drawing
   */
  series: {
    columns: {
      name: string
      unit: string
      label: string
    }[]
    rows: number[][]
  }
}
export interface Epochs {
  engine: string
  scenarios: {
    code: string
    columns: Column[]
    rows: (number | null)[][]
    notes: Note[]
  }[]
}
export interface Column {
  name:
    | 'time'
    | 'timeError'
    | 'age'
    | 'ageError'
    | 'lookback'
    | 'lookbackError'
    | 'scale'
    | 'scaleError'
    | 'redshift'
    | 'redshiftError'
    | 'hubble'
    | 'hubbleError'
    | 'deceleration'
    | 'decelerationError'
    | 'jerk'
    | 'jerkError'
    | 'omegaMatter'
    | 'omegaMatterError'
    | 'omegaRadiation'
    | 'omegaRadiationError'
    | 'omegaNeutrino'
    | 'omegaNeutrinoError'
    | 'omegaCurvature'
    | 'omegaCurvatureError'
    | 'omegaDark'
    | 'omegaDarkError'
    | 'w'
    | 'wError'
    | 'comoving'
    | 'comovingError'
    | 'transverse'
    | 'transverseError'
    | 'angular'
    | 'angularError'
    | 'luminosity'
    | 'luminosityError'
    | 'modulus'
    | 'modulusError'
    | 'arcsecond'
    | 'arcsecondError'
    | 'volume'
    | 'volumeError'
    | 'conformal'
    | 'conformalError'
    | 'particleHorizon'
    | 'particleHorizonError'
    | 'eventHorizon'
    | 'eventHorizonError'
    | 'hubbleRadius'
    | 'hubbleRadiusError'
    | 'temperature'
    | 'temperatureError'
    | 'criticalDensity'
    | 'criticalDensityError'
    | 'drift'
    | 'driftError'
    | 'growth'
    | 'growthError'
    | 'growthRate'
    | 'growthRateError'
  unit: string
  label: string
}
export interface Note {
  row: number
  column: string | null
  because: string
}
export interface Table {
  engine: string
  scenarios: {
    code: string
    columns: Column[]
    rows: (number | null)[][]
  }[]
}
export interface Ruler {
  scenarios: {
    slot: number
    name: string
  }[]
  at: RulerRow[]
  /**
   * Empty where there is but one epoch
   */
  between: RulerRow[]
  /**
   * Why cells are empty, or what has to be said beside them
   */
  notes: string[]
  /**
   * By key, what cannot be read as it was typed
   */
  complaints: {
    at?: string
    until?: string
    length?: string
    line?: string
    sky?: string
  }
  downloads: {
    format: string
    link: string
  }[]
}
export interface RulerRow {
  key: string
  symbol: string
  label: string
  unit: string
  /**
   * One for each scenario, rounded as the page shows it; null where there is none
   */
  cells: (string | null)[]
}
export interface RulerTable {
  engine: string
  scenarios: {
    code: string
    columns: {
      name: string
      unit: string
      label: string
    }[]
    rows: (number | null)[][]
  }[]
}
export interface Neighbourhoods {
  engine: string
  scenarios: {
    code: string
    /**
     * The density that closes the budget
     */
    closes: 'curvature' | 'dark'
    origin: 'big-bang' | 'bounce' | 'eternal' | 'static' | 'oscillating' | 'singular'
    end:
      | 'crunch'
      | 'rip'
      | 'little-rip'
      | 'exponential'
      | 'accelerating'
      | 'coasting'
      | 'decelerating'
      | 'static'
      | 'singular'
      | 'oscillating'
    /**
     * The nearest that growing steps find from the value given; two boundaries between the same two steps are missed
     */
    neighbours: Neighbour[]
    /**
     * Of a scalar field: beyond these there is no solution
     */
    edges: Edge[]
    leftOut: {
      parameter: string
      because: string
    }[]
  }[]
}
export interface Neighbour {
  /**
   * Key of the scenario code
   */
  parameter: string
  /**
   * Place in a list of numbers, counted from 0
   */
  index: number | null
  symbol: string
  /**
   * Where the kind changes
   */
  value: number
  /**
   * The boundary lies no farther from the value; about 2e-10 of it where no integration is needed
   */
  accuracy: number
  /**
   * The same less the value given; 0 where any change will do, within the accuracy
   */
  change: number
  direction: 'up' | 'down'
  end: {
    from:
      | 'crunch'
      | 'rip'
      | 'little-rip'
      | 'exponential'
      | 'accelerating'
      | 'coasting'
      | 'decelerating'
      | 'static'
      | 'singular'
      | 'oscillating'
    to:
      | 'crunch'
      | 'rip'
      | 'little-rip'
      | 'exponential'
      | 'accelerating'
      | 'coasting'
      | 'decelerating'
      | 'static'
      | 'singular'
      | 'oscillating'
  } | null
  origin: {
    from: 'big-bang' | 'bounce' | 'eternal' | 'static' | 'oscillating' | 'singular'
    to: 'big-bang' | 'bounce' | 'eternal' | 'static' | 'oscillating' | 'singular'
  } | null
  /**
   * False where a kind on either side is seen by integration, not proven
   */
  certain: boolean
  /**
   * Why it begins or ends so beyond the boundary
   */
  because: string
}
export interface Edge {
  /**
   * Key of the scenario code
   */
  parameter: string
  /**
   * Place in a list of numbers, counted from 0
   */
  index: number | null
  symbol: string
  /**
   * Up to where there are solutions
   */
  value: number
  /**
   * The boundary lies no farther from the value; about 2e-10 of it where no integration is needed
   */
  accuracy: number
  /**
   * The same less the value given
   */
  change: number
  direction: 'up' | 'down'
  /**
   * Why there is none beyond, such as the largest density that the field can reach
   */
  because: string
}
/**
 * Problem details, RFC 9457
 */
export interface Problem {
  type: string
  title: string
  status: number
  detail: string
  instance: string
  errors: RefusedParameter[]
}
export interface RefusedParameter {
  parameter: string
  /**
   * The place of its s, counted from 0
   */
  scenario: number | null
  value: string | null
  allowed: string
  message: string
}
export interface Words {
  engine: string
  figure: {
    caption: string
    alternative: string
  }
  scenarios: {
    code: string
    label: string
    caption: string
    alternative: string
    summary: string
    methods: string
    press: {
      facts: {
        title: string
        text: string
      }[]
    }
  }[]
  /**
   * LaTeX
   */
  macros: string
  bibtex: string
}
export interface OEmbed {
  version: '1.0'
  type: 'rich'
  provider_name: string
  provider_url: string
  title: string
  html: string
  width: number
  height: number
  thumbnail_url: string
  thumbnail_width: number
  thumbnail_height: number
}
