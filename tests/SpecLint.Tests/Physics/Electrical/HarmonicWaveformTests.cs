using System.Collections.Immutable;
using System.Numerics;
using CsCheck;
using SpecLint.Physics.Electrical;

namespace SpecLint.Tests.Physics.Electrical;

public sealed class HarmonicWaveformTests
{
    private static readonly Gen<HarmonicWaveform> Waveforms =
        Gen.Select(Gen.Double[-1.0, 1.0], Gen.Double[-1.0, 1.0]).Select((re, im) => new Complex(re, im)).Array[1, 8]
            .Where(a => a[0].Magnitude > 0.05)
            .Select(a => new HarmonicWaveform { Amplitudes = ImmutableArray.Create(a) });

    [Fact]
    public void Sine_HasTextbookFigures()
    {
        var sine = new HarmonicWaveform { Amplitudes = [new Complex(3.0, -4.0)] };

        Assert.Equal(5.0, sine.Fundamental, 1e-15);
        Assert.Equal(5.0 / Math.Sqrt(2.0), sine.Rms, 1e-14);
        Assert.Equal(5.0, sine.Peak, 1e-8);
        Assert.Equal(Math.Sqrt(2.0), sine.CrestFactor, 1e-8);
        Assert.Equal(0.0, sine.Distortion, 1e-7);
        Assert.Equal(2.0 / Math.PI * Math.Asin(0.05), sine.ShareBelow(0.05), 2e-5);
    }

    // Square wave by its series of 1/n up to order 15: distortion sqrt(pi²/8 partial sum - 1).
    [Fact]
    public void SquareSeries_DistortionIsPartialSum()
    {
        var square = new HarmonicWaveform { Amplitudes = [.. Enumerable.Range(0, 8).Select(i => new Complex(0.0, -1.0 / (2 * i + 1)))] };
        double expected = Math.Sqrt(Enumerable.Range(1, 7).Sum(i => Math.Pow(2 * i + 1, -2)));

        Assert.Equal(expected, square.Distortion, 1e-12);
    }

    [Fact]
    public void Rms_MatchesMeanOfSamples() => Waveforms.Sample(wave =>
    {
        double mean = Enumerable.Range(0, 64).Average(i => Math.Pow(wave.At(2.0 * Math.PI * i / 64), 2));
        Assert.Equal(Math.Sqrt(mean), wave.Rms, 1e-9);
    });

    [Fact]
    public void Peak_MatchesDenseSearch() => Waveforms.Sample(wave =>
    {
        double dense = Enumerable.Range(0, 20000).Max(i => Math.Abs(wave.At(Math.PI * i / 20000)));
        Assert.Equal(dense, wave.Peak, 2e-5 * dense);
    }, iter: 30);

    [Fact]
    public void ShareBelow_MatchesDenseCount() => Waveforms.Sample(wave =>
    {
        double limit = 0.05 * wave.Peak;
        double dense = Enumerable.Range(0, 20000).Count(i => Math.Abs(wave.At(Math.PI * (i + 0.5) / 20000)) < limit) / 20000.0;
        Assert.Equal(dense, wave.ShareBelow(0.05), 1.5e-3);
    }, iter: 30);

    [Fact]
    public void ShareBelow_ZeroWaveform_IsNotANumber() =>
        Assert.True(double.IsNaN(new HarmonicWaveform { Amplitudes = [Complex.Zero] }.ShareBelow(0.05)));

    [Fact]
    public void Samples_EqualDirectValues()
    {
        var wave = new HarmonicWaveform { Amplitudes = [1.0, new Complex(0.2, 0.3), -0.1] };
        var samples = new double[200];

        wave.FillSamples(samples, 0.05);

        for (int i = 0; i < samples.Length; i++)
        {
            Assert.Equal(wave.At(0.05 * i), samples[i], 1e-12);
        }
    }
}
