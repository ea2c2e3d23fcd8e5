/** The few konva shapes the canvas uses; the whole library would triple what the bench loads. */
import 'konva/lib/shapes/Line'
import 'konva/lib/shapes/Rect'
import 'konva/lib/shapes/Text'

export { Group, Layer, Line, Rect, Shape, Stage, Text } from 'react-konva/lib/ReactKonvaCore'
