package pinchoff.chart;

import pinchoff.drawing.Colour;
import pinchoff.drawing.Dash;

/** How an item is drawn. */
record Look(Colour colour, Dash dash) {}
