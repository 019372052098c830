using SkiaSharp;

namespace ScanSim.Display.Windowing;

/// <summary>Skia draws into a streaming texture that a renderer of SDL shows: slower by a copy, but it works where surfaces do not.</summary>
internal sealed class TexturePixels : IWindowPixels
{
    private readonly nint renderer;
    private nint texture;
    private SKSizeI textureSize;

    public TexturePixels(nint window)
    {
        // Any renderer first: on systems without window surfaces the software one has nothing to draw on.
        renderer = Sdl.CreateRenderer(window, -1, 0);
        if (renderer == 0)
        {
            renderer = Sdl.CreateRenderer(window, -1, Sdl.RendererSoftware);
        }
    }

    public bool Works => renderer != 0;

    public SKSizeI Size => renderer != 0 && Sdl.GetRendererOutputSize(renderer, out var width, out var height) == 0 ? new SKSizeI(width, height) : default;

    public bool Paint(Action<SKCanvas> draw)
    {
        var size = Size;
        if (!Fit(size) || Sdl.LockTexture(texture, 0, out var pixels, out var pitchBytes) != 0)
        {
            return false;
        }

        var info = new SKImageInfo(size.Width, size.Height, SKColorType.Bgra8888, SKAlphaType.Opaque);
        var drawn = SurfacePixels.Draw(info, pixels, pitchBytes, draw);
        Sdl.UnlockTexture(texture);
        if (!drawn || Sdl.RenderClear(renderer) != 0 || Sdl.RenderCopy(renderer, texture, 0, 0) != 0)
        {
            return false;
        }

        Sdl.RenderPresent(renderer);
        return true;
    }

    public void Dispose()
    {
        DropTexture();
        if (renderer != 0)
        {
            Sdl.DestroyRenderer(renderer);
        }
    }

    private bool Fit(SKSizeI size)
    {
        if (size != textureSize || texture == 0)
        {
            DropTexture();
            texture = size.IsEmpty ? 0 : Sdl.CreateTexture(renderer, Sdl.FormatArgb8888, Sdl.TextureStreaming, size.Width, size.Height);
            textureSize = size;
        }

        return texture != 0;
    }

    private void DropTexture()
    {
        if (texture != 0)
        {
            Sdl.DestroyTexture(texture);
            texture = 0;
        }
    }
}
