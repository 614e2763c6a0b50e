package org.pofk.report;

/** The picture of a chart. */
final class Pictures implements Chart.Visitor<Picture> {
    private Pictures() {
    }

    static Picture of(Chart chart) {
        return chart.accept(new Pictures());
    }

    @Override
    public Picture course(Chart.Course course) {
        return CoursePicture.of(course);
    }

    @Override
    public Picture poleMap(Chart.PoleMap poleMap) {
        return PolePicture.of(poleMap);
    }

    @Override
    public Picture stateDiagram(Chart.StateDiagram diagram) {
        return StatePicture.of(diagram);
    }
}
