// The window: how long until it is first painted, and from an edit to everything repainted.

#include <benchmark/benchmark.h>

#include <QApplication>
#include <QTemporaryDir>

#include "session/session.h"
#include "sheet/sheet_writer.h"
#include "window/main_window.h"

namespace {

void first_paint(benchmark::State& state) {
    for (auto _ : state) {
        Session session;
        MainWindow window(session);
        window.resize(1320, 860);
        window.show();
        QApplication::processEvents();
        benchmark::DoNotOptimize(window.grab());
    }
}

/// Each edit changes the power, so that every number, the route and the chart are new. Between 2 W and 3 W
/// the axes stay; between 2 W and 2 mW they change too.
void edit_to_updated(benchmark::State& state, const char* other_power) {
    Session session;
    MainWindow window(session);
    window.resize(1320, 860);
    window.show();
    QApplication::processEvents();
    int n = 0;
    for (auto _ : state) {
        dosimetry::Setup next = session.setup();
        next.sources.front().power =
            dosimetry::Stated<dosimetry::RadiantPower>(++n % 2 == 0 ? "2 W" : other_power);
        session.edit(next, "power", "power");
        QApplication::processEvents();
    }
}

void sheet_as_pdf(benchmark::State& state) {
    const QTemporaryDir folder;
    Session session;
    for (auto _ : state)
        writeSheetPdf(folder.filePath("s.pdf"), session.setup(), session.assessment(), session.fileBytes(),
                      paperSize("A4"));
}

BENCHMARK(first_paint)->Unit(benchmark::kMillisecond);
BENCHMARK_CAPTURE(edit_to_updated, same_axes, "3 W")->Unit(benchmark::kMillisecond);
BENCHMARK_CAPTURE(edit_to_updated, other_axes, "2 mW")->Unit(benchmark::kMillisecond);
BENCHMARK(sheet_as_pdf)->Unit(benchmark::kMillisecond);

}  // namespace

int main(int argc, char** argv) {
    qputenv("QT_QPA_PLATFORM", "offscreen");
    const QTemporaryDir settings;
    qputenv("XDG_CONFIG_HOME", settings.path().toLocal8Bit());
    QApplication application(argc, argv);
    benchmark::Initialize(&argc, argv);
    benchmark::RunSpecifiedBenchmarks();
}
