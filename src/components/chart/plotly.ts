import Plotly from 'plotly.js-dist-min';
import createPlotlyComponent from 'react-plotly.js/factory';

/** The plot library as a React component; imported lazily, since it is far larger than the rest of the page. */
export const Plot = createPlotlyComponent(Plotly);
